package sillet.desktop.intake;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import java.util.List;
import java.util.UUID;
import java.util.stream.IntStream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.actions.TakeIn;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.shop.Customer;
import sillet.logbook.shop.Shop;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.visits.StringsOn;
import sillet.logbook.visits.Visit;

class IntakeModelTest {
  private static final LocalDate TODAY = LocalDate.of(2026, 12, 1);
  private static final Shop SHOP = Shop.usual("Invented shop", List.of("Noor"));

  private IntakeModel model;

  @BeforeEach
  void emptyPage() {
    model =
        new IntakeModel(SHOP, UsualThings.load(), TODAY, UUID::randomUUID, new NothingUnusual());
  }

  private void typeAnElectric() {
    model.customer().name().fill("Maren Oduya");
    model.instrument().model().fill("Fieldfare");
    model.instrument().neck().scaleTreble().fill("648");
    model.instrument().saddle().screw().fill("M3");
    model.neckTyped();
    List<String> gauges = List.of("10", "13", "17", "26", "36", "46");
    for (int i = 0; i < gauges.size(); i++) {
      model.strings().lines().get(i).gauge().fill(gauges.get(i));
    }
    model.gaugesTyped();
    model.arrival().request().fill("Sour past the seventh fret.");
    model.arrival().promised().fill("+3");
  }

  private Visit visit() {
    List<Action> actions = model.actions(2417, "Edda");
    return ((TakeIn) actions.get(actions.size() - 1)).visit();
  }

  @Test
  void anEmptyPageCannotBeTakenIn() {
    assertThat(model.look()).isFalse();
    assertThat(model.customer().name().problemProperty().get()).isPresent();
    assertThat(model.instrument().model().problemProperty().get()).isPresent();
    assertThat(model.strings().lines().get(5).gauge().problemProperty().get()).isPresent();
    assertThat(model.arrival().request().problemProperty().get()).isPresent();
  }

  @Test
  void takesInWhatWasTyped() {
    typeAnElectric();
    assertThat(model.look()).isTrue();
    List<Action> actions = model.actions(2417, "Edda");
    assertThat(actions)
        .hasExactlyElementsOfTypes(AddCustomer.class, AddInstrument.class, TakeIn.class);
    Instrument instrument = ((AddInstrument) actions.get(1)).instrument();
    assertThat(instrument.saddle().screwPitchMm()).isEqualTo(0.5);
    assertThat(instrument.saddle().screwSense()).isEqualTo(ScrewSense.NOT_KNOWN);
    assertThat(instrument.neck().frets()).isEqualTo(22);
    Visit visit = visit();
    assertThat(visit.ticket()).isEqualTo(2417);
    assertThat(visit.instrumentId()).isEqualTo(instrument.id());
    assertThat(visit.arrival().promised()).isEqualTo(LocalDate.of(2026, 12, 4));
    assertThat(visit.arrival().takenInBy()).isEqualTo("Edda");
  }

  @Test
  void fillsTuningScaleAndConstructionAsUsual() {
    typeAnElectric();
    List<FittedString> strings = visit().strings().strings();
    assertThat(strings)
        .extracting(string -> string.pitch().typed())
        .containsExactly("E4", "B3", "G3", "D3", "A2", "E2");
    assertThat(strings).extracting(FittedString::scaleMm).containsOnly(648.0);
    assertThat(strings.get(2).make()).isEqualTo(StringMake.of(.017, Construction.PLAIN_STEEL));
    assertThat(strings.get(3).make()).isEqualTo(StringMake.of(.026, Construction.WOUND_STEEL));
  }

  @Test
  void windsAThickStringAlsoWhenTheHandIsStillInItsGauge() {
    typeAnElectric();
    model.strings().lines().get(2).gauge().fill("24");
    assertThat(model.look()).isTrue();
    assertThat(visit().strings().strings().get(2).make())
        .isEqualTo(StringMake.of(.024, Construction.WOUND_STEEL));
  }

  @Test
  void keepsAConstructionThatWasChosen() {
    typeAnElectric();
    model.strings().lines().get(2).construction(Construction.WOUND_NICKEL);
    model.gaugesTyped();
    assertThat(visit().strings().strings().get(2).make().construction())
        .isEqualTo(Construction.WOUND_NICKEL);
  }

  @Test
  void savingAgainMakesTheSamePersonAndInstrument() {
    typeAnElectric();
    assertThat(model.actions(2417, "Edda")).isEqualTo(model.actions(2417, "Edda"));
  }

  @Test
  void aKnownPersonWithAKnownInstrumentIsOnlyTakenIn() {
    typeAnElectric();
    Customer owner = new Customer(UUID.randomUUID(), "Tove Lindqvarn", "555 0126", "", "");
    Instrument known = model.instrument().instrument(owner.id());
    model.customer().choose(owner);
    model.choose(known);
    assertThat(model.look()).isTrue();
    assertThat(model.actions(2418, "Edda")).hasExactlyElementsOfTypes(TakeIn.class);
    assertThat(visit().customerId()).isEqualTo(owner.id());
    assertThat(visit().instrumentId()).isEqualTo(known.id());
  }

  @Test
  void keepsANewSetUnderItsNameAndNotOneTheDrawerHasAsItIs() {
    typeAnElectric();
    model.strings().keepAsSet(true);
    assertThat(model.look()).as("a kept set needs a name").isFalse();
    model.strings().setName().fill("Light six");
    assertThat(model.look()).isTrue();
    KeepStringSet kept = model.strings().keeping().orElseThrow();
    assertThat(kept.set().name()).isEqualTo("Light six");
    assertThat(kept.set().strings()).hasSize(6);
    model.strings().take(kept.set());
    assertThat(model.strings().keeping()).isEmpty();
  }

  @Test
  void takesASetOutOfTheDrawer() {
    typeAnElectric();
    StringMake measured = new StringMake(.046, Construction.WOUND_STEEL, .018, 6.2);
    StringMake plain = StringMake.of(.010, Construction.PLAIN_STEEL);
    model
        .strings()
        .take(
            new StringSet(
                UUID.randomUUID(),
                "Known core",
                IntStream.range(0, 6).mapToObj(i -> i == 5 ? measured : plain).toList()));
    assertThat(visit().strings().setName()).isEqualTo("Known core");
    assertThat(visit().strings().strings().get(5).make()).isEqualTo(measured);
    model.strings().lines().get(5).gauge().fill("48");
    assertThat(visit().strings().strings().get(5).make())
        .as("what is known of a core belongs to its gauge")
        .isEqualTo(StringMake.of(.048, Construction.WOUND_STEEL));
  }

  /** Fret 5 lies at 2^(-5/12) of the scale: equal temperament. */
  @Test
  void givesTheShortFifthStringOfABanjoItsOwnScale() {
    model.kind(InstrumentKind.BANJO);
    model.instrument().neck().scaleTreble().fill("670");
    model.neckTyped();
    assertThat(model.strings().lines()).hasSize(5);
    assertThat(model.strings().lines().get(4).scale().value().orElseThrow().mm())
        .isCloseTo(670 * Math.pow(2, -5 / 12.0), within(0.006));
    assertThat(model.strings().lines().get(4).pitch().value().orElseThrow().typed())
        .isEqualTo("G4");
  }

  @Test
  void spreadsAFannedScaleOverTheStringsInEvenSteps() {
    model.instrument().neck().strings().fill("7");
    model.instrument().neck().scaleTreble().fill("648");
    model.instrument().neck().scaleBass().fill("684");
    model.neckTyped();
    assertThat(model.strings().lines())
        .extracting(line -> line.scale().value().orElseThrow().mm())
        .containsExactly(648.0, 654.0, 660.0, 666.0, 672.0, 678.0, 684.0);
  }

  @Test
  void asksForAThicknessOnlyWhereThereIsOneSaddle() {
    typeAnElectric();
    model.instrument().saddle().kind(SaddleKind.ONE_PIECE);
    model.instrument().saddle().thickness().fill("1/8");
    List<Action> actions = model.actions(1, "Edda");
    Instrument instrument = ((AddInstrument) actions.get(1)).instrument();
    assertThat(instrument.saddle().thicknessMm()).isCloseTo(3.175, within(1e-9));
    assertThat(instrument.saddle().screwPitchMm()).isNull();
  }

  @Test
  void takesTheStringsAnInstrumentHadWhenItWasHereLast() {
    typeAnElectric();
    StringsOn last = visit().strings();
    emptyPage();
    model.instrument().neck().scaleTreble().fill("648");
    model.neckTyped();
    model.strings().take(last);
    model.customer().name().fill("Maren Oduya");
    model.instrument().model().fill("Fieldfare");
    model.arrival().request().fill("Again");
    assertThat(model.look()).isTrue();
    assertThat(visit().strings()).isEqualTo(last);
  }

  /** Person and instrument were saved before taking in failed; then somebody else is typed. */
  @Test
  void makesAnotherPersonAndInstrumentAfterAHalfFailedSave() {
    typeAnElectric();
    List<Action> halfDone = model.actions(2417, "Edda");
    Customer saved = ((AddCustomer) halfDone.get(0)).customer();
    Instrument kept = ((AddInstrument) halfDone.get(1)).instrument();
    model.customer().choose(saved);
    model.instrument().choose(kept);
    assertThat(model.actions(2417, "Edda")).hasExactlyElementsOfTypes(TakeIn.class);
    model.customer().someoneNew();
    model.instrument().anotherOne();
    typeAnElectric();
    model.customer().name().fill("Tove Lindqvarn");
    List<Action> again = model.actions(2417, "Edda");
    assertThat(((AddCustomer) again.get(0)).customer().id()).isNotEqualTo(saved.id());
    assertThat(((AddInstrument) again.get(1)).instrument().id()).isNotEqualTo(kept.id());
    assertThat(model.actions(2417, "Edda")).as("from then on the same").isEqualTo(again);
  }
}
