package sillet.desktop.intake;

import java.util.List;
import java.util.Optional;
import java.util.UUID;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.shop.Customer;
import sillet.logbook.text.Message;

/** Whose instrument it is: a person the logbook knows, or a new one. */
public final class CustomerModel {
  private final TypedFieldModel<String> name =
      TypedFieldModel.required(Readers.words(), Message.of("intake.customer.name-missing"));
  private final TypedFieldModel<String> phone = TypedFieldModel.optional(Readers.words());
  private final TypedFieldModel<String> note = TypedFieldModel.optional(Readers.words());
  private final Supplier<UUID> ids;
  private UUID newId;
  private @Nullable Customer known;

  /**
   * Nobody yet.
   *
   * @param ids a new identity each time, should it be a new person
   */
  public CustomerModel(Supplier<UUID> ids) {
    this.ids = ids;
    this.newId = ids.get();
  }

  public TypedFieldModel<String> name() {
    return name;
  }

  public TypedFieldModel<String> phone() {
    return phone;
  }

  /** What the bench should know of the person. */
  public TypedFieldModel<String> note() {
    return note;
  }

  /** The person chosen from those the logbook knows. */
  public Optional<Customer> known() {
    return Optional.ofNullable(known);
  }

  /** Takes a person the logbook knows. */
  public void choose(Customer customer) {
    known = customer;
    name.fill(customer.name());
    phone.fill(customer.phone());
    note.fill(customer.note());
  }

  /** It is somebody new after all; what was typed as the name stays. */
  public void someoneNew() {
    if (known != null) {
      known = null;
      // the known one may have been made on this page a moment ago, under the identity given then
      newId = ids.get();
      phone.fill("");
      note.fill("");
    }
  }

  /** True while nobody was typed or chosen. */
  public boolean blank() {
    return known == null && name.typedProperty().get().isBlank();
  }

  /** Judges the fields. */
  public boolean look() {
    return Judged.all(List.of(name, phone, note));
  }

  /** The person as chosen or typed. */
  public Customer customer() {
    if (known != null) {
      return known;
    }
    return new Customer(
        newId, name.value().orElse(""), phone.value().orElse(""), "", note.value().orElse(""));
  }
}
