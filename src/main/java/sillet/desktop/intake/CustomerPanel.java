package sillet.desktop.intake;

import java.util.List;
import java.util.function.Consumer;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.Desk;
import sillet.desktop.theme.Looks;
import sillet.logbook.shop.Customer;
import sillet.logbook.text.Texts;
import sillet.store.reading.Kept;

/** Whose instrument it is. Known persons are offered while one types. */
final class CustomerPanel extends VBox {
  private final CustomerModel model;
  private final Desk desk;
  private final Texts texts;
  private final Consumer<Customer> chosen;
  private final TextField name;
  private final TextField phone;
  private final TextField note;
  private final Label state = new Label();
  private final Suggestions<Customer> known =
      new Suggestions<>("known-customers", this::words, this::choose);
  private boolean filling;

  CustomerPanel(CustomerModel model, Desk desk, Consumer<Customer> chosen) {
    this.model = model;
    this.desk = desk;
    this.texts = desk.texts();
    this.chosen = chosen;
    Label head = new Label(texts.say("intake.customer"));
    head.getStyleClass().add(Looks.PANEL_HEAD);
    state.getStyleClass().add(Looks.NOTE);
    state.setWrapText(true);
    state.setMinHeight(USE_PREF_SIZE);
    FormGrid form = new FormGrid(texts);
    name =
        form.words(
            model.name(),
            texts.say("intake.customer.name"),
            "customer-name",
            field -> known.under(field));
    phone = form.words(model.phone(), texts.say("intake.customer.phone"), "customer-phone");
    note = form.words(model.note(), texts.say("intake.customer.note"), "customer-note");
    getStyleClass().addAll(Looks.PANEL, "intake-panel");
    getChildren().addAll(head, form, state);
    name.textProperty().addListener((property, before, now) -> typed(now));
    show();
  }

  private String words(Customer customer) {
    return customer.phone().isEmpty()
        ? customer.name()
        : texts.say("intake.customer.known", customer.name(), customer.phone());
  }

  private void typed(String now) {
    boolean namesKnown = model.known().filter(one -> one.name().equals(now)).isPresent();
    if (filling || namesKnown) {
      return;
    }
    if (model.known().isPresent()) {
      model.someoneNew();
      show();
    }
    if (now.isBlank()) {
      known.offer(List.of());
      return;
    }
    desk.background()
        .run(
            () -> desk.logbook().shop().customers(now).newest(),
            found -> offer(now, found),
            desk.ask()::problem);
  }

  /** An answer to something typed before the last key is no use any more. */
  private void offer(String asked, List<Kept<Customer>> found) {
    if (asked.equals(name.getText()) && model.known().isEmpty()) {
      known.offer(found.stream().map(Kept::what).toList());
    }
  }

  /** Takes a person the logbook knows. */
  void choose(Customer customer) {
    filling = true;
    model.choose(customer);
    filling = false;
    known.offer(List.of());
    show();
    name.requestFocus();
    chosen.accept(customer);
  }

  /** Shows whether the person is known, and locks what is only to look at. */
  void show() {
    boolean isKnown = model.known().isPresent();
    phone.setEditable(!isKnown);
    note.setEditable(!isKnown);
    state.setText(texts.say(isKnown ? "intake.customer.is-known" : "intake.customer.is-new"));
  }

  void focus() {
    name.requestFocus();
  }
}
