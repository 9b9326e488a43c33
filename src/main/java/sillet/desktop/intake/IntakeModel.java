package sillet.desktop.intake;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.UUID;
import java.util.function.Supplier;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.shop.Customer;
import sillet.logbook.shop.Shop;
import sillet.logbook.strings.Tuning;
import sillet.logbook.visits.Visit;

/**
 * The whole page. Saving again after a failure never makes a second person or instrument: an
 * identity stays until somebody or something else is typed.
 */
public final class IntakeModel {
  private final UsualThings usual;
  private final CustomerModel customer;
  private final InstrumentModel instrument;
  private final StringsModel strings;
  private final ArrivalModel arrival;
  private final UUID visitId;

  /**
   * An empty page.
   *
   * @param shop its unit and reference
   * @param usual what is usual for each kind
   * @param today day of the arrival
   * @param ids a new identity each time
   * @param unusual warnings
   */
  public IntakeModel(
      Shop shop, UsualThings usual, LocalDate today, Supplier<UUID> ids, Unusual unusual) {
    this.usual = usual;
    this.customer = new CustomerModel(ids);
    this.instrument = new InstrumentModel(ids, shop.lengthUnit(), unusual::scale);
    this.strings =
        new StringsModel(ids.get(), shop.lengthUnit(), shop.referenceHz(), today, unusual::gauge);
    this.arrival = new ArrivalModel(today);
    this.visitId = ids.get();
    kind(instrument.kind());
  }

  public CustomerModel customer() {
    return customer;
  }

  public InstrumentModel instrument() {
    return instrument;
  }

  public StringsModel strings() {
    return strings;
  }

  public ArrivalModel arrival() {
    return arrival;
  }

  /** Chooses a kind: usual strings, frets, saddle and tuning are filled in. */
  public void kind(InstrumentKind kind) {
    instrument.kind(usual.of(kind));
    neckTyped();
    tunings().stream().findFirst().ifPresent(strings::take);
  }

  /** Takes an instrument the logbook knows, and whoever brought it last. */
  public void choose(Instrument known) {
    instrument.choose(known);
    neckTyped();
    tunings().stream().findFirst().ifPresent(strings::take);
  }

  /** The neck was typed or changed: lines and scales follow. */
  public void neckTyped() {
    instrument.neck().strings().value().ifPresent(strings::count);
    if (instrument.neck().strings().value().isPresent()
        && instrument.neck().frets().value().isPresent()
        && instrument.neck().scaleTreble().value().isPresent()) {
      strings.scales(instrument.neck().neck(), instrument.kind());
    }
  }

  /** Gauges were typed: constructions follow. */
  public void gaugesTyped() {
    strings.usual(usual.of(instrument.kind()));
  }

  /** Usual tunings of this kind with so many strings. */
  public List<Tuning> tunings() {
    return usual.tunings(instrument.kind(), strings.lines().size());
  }

  /** Judges every field; the hand may still be in the last gauge. */
  public boolean look() {
    gaugesTyped();
    boolean owner = customer.look();
    boolean brought = instrument.look();
    boolean strung = strings.look();
    return arrival.look() && strung && brought && owner;
  }

  /**
   * What taking in means, in order; call after the fields were judged.
   *
   * @param ticket the number of the visit
   * @param technician who takes it in
   */
  public List<Action> actions(int ticket, String technician) {
    List<Action> actions = new ArrayList<>();
    Customer owner = customer.customer();
    if (customer.known().isEmpty()) {
      actions.add(new AddCustomer(owner));
    }
    Instrument brought = instrument.instrument(owner.id());
    if (instrument.known().isEmpty()) {
      actions.add(new AddInstrument(brought));
    }
    strings.keeping().ifPresent(actions::add);
    actions.add(
        new TakeIn(
            new Visit(
                visitId,
                ticket,
                brought.id(),
                owner.id(),
                arrival.arrival(technician),
                strings.strings(),
                List.of(),
                null)));
    return actions;
  }
}
