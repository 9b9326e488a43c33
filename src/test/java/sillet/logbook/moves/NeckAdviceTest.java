package sillet.logbook.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.offset;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;

/** What the advisor says of an instrument that was read along its neck. */
class NeckAdviceTest {
  private final MoveAdvisor advisor = new MoveAdvisor(75);
  private final Texts texts = Texts.english();

  @Test
  void findsNothingOnACleanInstrument() {
    InstrumentAdvice advice = advise(NeckStrings.CLEAN, NutMovable.NO, AimChoice.NECK);
    assertThat(advice.findings()).isEmpty();
    assertThat(advice.strings()).hasSize(6).allMatch(one -> one.figures() != null);
  }

  @Test
  void namesAHighSlotOnItsStringAndAMisplacedFretOnAll() {
    InstrumentAdvice advice = advise(NeckStrings.SLOT_AND_FRET, NutMovable.NO, AimChoice.OCTAVE);
    assertThat(advice.findings())
        .extracting(FindingReport::word)
        .containsExactly("nut-high", "fret-7");
    FindingReport slot = advice.findings().get(0);
    assertThat(slot.string()).isEqualTo(4);
    assertThat(slot.worthCents()).isBetween(0.5, 3.0);
    assertThat(texts.say(slot.evidence())).startsWith("String 4 lies 0.").contains("slot is high");
    assertThat(slot.caution()).isNotNull();
    FindingReport fret = advice.findings().get(1);
    assertThat(fret.string()).isNull();
    assertThat(texts.say(fret.evidence()))
        .startsWith("Fret 7 stands 0.")
        .contains("toward the bridge");
    assertThat(words(advice, 1)).containsExactly("fret-7");
    assertThat(words(advice, 4)).containsExactly("nut-high", "fret-7");
  }

  @Test
  void namesANutThatStandsTooFar() {
    InstrumentAdvice advice = advise(NeckStrings.NUT_FAR, NutMovable.NO, AimChoice.NECK);
    assertThat(advice.findings()).extracting(FindingReport::word).containsExactly("nut-far");
    for (int string = 1; string <= 6; string++) {
      assertThat(words(advice, string)).containsExactly("nut-far");
    }
    assertThat(texts.say(advice.findings().get(0).whatToDo())).contains("fret 1 to fret 13");
  }

  @Test
  void neverAdvisesTurnsOfATrussRod() {
    for (List<String> rows : List.of(NeckStrings.SLOT_AND_FRET, NeckStrings.NUT_FAR)) {
      for (FindingReport one : advise(rows, NutMovable.NO, AimChoice.NECK).findings()) {
        assertThat(texts.say(one.whatToDo())).doesNotContainIgnoringCase("rod");
      }
    }
  }

  @Test
  void movesANutThatMayMoveAndLeavesOneThatMayNot() {
    InstrumentAdvice fixed = advise(NeckStrings.NUT_FAR, NutMovable.NO, AimChoice.NECK);
    assertThat(fixed.strings()).allMatch(one -> figures(one).nutMm() == null);
    InstrumentAdvice whole = advise(NeckStrings.NUT_FAR, NutMovable.WHOLE, AimChoice.NECK);
    double nutMm = figures(whole.strings().get(0)).nutMm();
    // the nut stands 1 mm too far; some of the sharp low frets is stretch, which it takes too
    assertThat(nutMm).isBetween(0.8, 2.2);
    assertThat(whole.strings())
        .allSatisfy(one -> assertThat(figures(one).nutMm()).isCloseTo(nutMm, offset(1e-9)));
    InstrumentAdvice each = advise(NeckStrings.NUT_FAR, NutMovable.EACH, AimChoice.NECK);
    for (int i = 0; i < 6; i++) {
      assertThat(figures(each.strings().get(i)).rmsAfter())
          .isLessThan(figures(fixed.strings().get(i)).rmsAfter());
    }
  }

  @Test
  void octaveKeepsFret12TrueAndOwnFretsWeighWhereTheCustomerPlays() {
    MoveFigures octave =
        figures(advise(NeckStrings.CLEAN, NutMovable.NO, AimChoice.OCTAVE).strings().get(2));
    assertThat(octave.cents12After()).isCloseTo(0, offset(0.01));
    AimChoice high = AimChoice.parse("12 15:3 17:3");
    MoveAdvice up = advise(NeckStrings.CLEAN, NutMovable.NO, high).strings().get(2);
    AimChoice low = AimChoice.parse("1:3 2:3 3");
    MoveAdvice down = advise(NeckStrings.CLEAN, NutMovable.NO, low).strings().get(2);
    assertThat(Math.abs(after(up, 17))).isLessThan(Math.abs(after(down, 17)));
    assertThat(Math.abs(after(down, 2))).isLessThan(Math.abs(after(up, 2)));
  }

  @Test
  void givesEveryNoteNowAndAfterAndSaysWhichWereRead() {
    MoveAdvice third = advise(NeckStrings.CLEAN, NutMovable.NO, AimChoice.NECK).strings().get(2);
    assertThat(third.neck()).extracting(FretCents::fret).startsWith(1, 2, 3).contains(12, 17, 22);
    for (FretCents note : third.neck()) {
      boolean read = third.string().readings().frets().containsKey(note.fret());
      assertThat(note.read()).isEqualTo(read);
      if (read) {
        double typed = third.string().readings().at(note.fret()).cents();
        assertThat(note.nowCents()).isCloseTo(typed, offset(1.5));
      }
      assertThat(note.sdCents()).isPositive();
    }
    // the strip starts from the best estimate, the figures from what was read: both change alike
    MoveFigures figures = figures(third);
    FretCents octave = third.neck().get(11);
    assertThat(octave.afterCents() - octave.nowCents())
        .isCloseTo(figures.cents12After() - figures.cents12Before(), offset(0.01));
  }

  @Test
  void readingsThatContradictEachOtherGetASentenceAndNoNaN() {
    List<BenchString> strings = new ArrayList<>(NeckStrings.read(NeckStrings.CLEAN, room()));
    BenchString third = strings.get(2);
    NoteReadings odd =
        new NoteReadings(
            new TreeMap<>(
                Map.of(5, Tries.parse("40"), 7, Tries.parse("-40"), 12, Tries.parse("40/-40"))),
            null,
            third.readings().against(),
            0.3);
    strings.set(2, new BenchString("test", third.string(), third.heights(), third.room(), odd));
    for (AimChoice aim : List.of(AimChoice.OCTAVE, AimChoice.NECK)) {
      InstrumentAdvice advice = advisor.advise(strings, aim);
      assertThat(words(advice, 3)).contains("reading");
      assertThat(words(advice, 1)).doesNotContain("reading");
      advice.strings().forEach(NeckAdviceTest::isFinite);
    }
  }

  @Test
  void aStringThatNoTensionTunesSaysSoAndTheOthersAreMovedAllTheSame() {
    List<BenchString> strings = new ArrayList<>(NeckStrings.read(NeckStrings.CLEAN, room()));
    FittedString impossible =
        new FittedString(
            6, Pitch.parse("20", 440), 40, StringMake.of(.140, Construction.PLAIN_STEEL));
    BenchString sixth = strings.get(5);
    strings.set(
        5,
        new BenchString(
            "test", impossible, sixth.heights(), sixth.room(), NoteReadings.of(Map.of())));
    InstrumentAdvice advice = advisor.advise(strings, AimChoice.NECK);
    assertThat(advice.strings().get(5).figures()).isNull();
    assertThat(advice.strings().get(5).notes())
        .extracting(Message::key)
        .contains("move.not-solved");
    for (int i = 0; i < 5; i++) {
      assertThat(advice.strings().get(i).figures()).isNotNull();
    }
  }

  @Test
  void aFloatingBridgeGetsItsTwoEndsAndWhatIsLeft() {
    SaddleRoom room = new SaddleRoom(null, null, null, SaddleKind.FLOATING, null, NutMovable.NO);
    BridgeAdvice bridge =
        advisor.advise(NeckStrings.read(NeckStrings.CLEAN, room), AimChoice.OCTAVE).bridge();
    assertThat(bridge).isNotNull();
    assertThat(bridge.left()).extracting(BridgeAdvice.StringLeft::string).hasSize(6);
    // only two strings can be met by a straight line; the others fall where they fall
    assertThat(bridge.left())
        .anySatisfy(one -> assertThat(Math.abs(one.cents12())).isGreaterThan(1));
    assertThat(bridge.left()).allMatch(one -> one.fromFrontMm() == null && one.fits() == null);
    assertThat(texts.say(bridge.notes().get(0))).contains("Slacken");
  }

  @Test
  void aFixedSaddleSaysWhereItsBreakPointsLieAndWhetherTheyFit() {
    SaddleRoom room = new SaddleRoom(null, 1.6, 1.6, SaddleKind.ONE_PIECE, 3.2, NutMovable.NO);
    InstrumentAdvice advice =
        advisor.advise(NeckStrings.read(NeckStrings.CLEAN, room), AimChoice.OCTAVE);
    BridgeAdvice bridge = advice.bridge();
    assertThat(bridge).isNotNull();
    for (int i = 0; i < 6; i++) {
      double point = 1.6 + figures(advice.strings().get(i)).saddleMm();
      assertThat(bridge.left().get(i).fromFrontMm()).isCloseTo(point, offset(1e-9));
      assertThat(bridge.left().get(i).fits()).isEqualTo(point >= 0.4 && point <= 3.2 - 0.4);
    }
    assertThat(bridge.left()).extracting(BridgeAdvice.StringLeft::fits).contains(true, false);
  }

  @Test
  void saddlesOfTheirOwnGetNoStraightLine() {
    assertThat(advise(NeckStrings.CLEAN, NutMovable.NO, AimChoice.OCTAVE).bridge()).isNull();
  }

  private static void isFinite(MoveAdvice one) {
    MoveFigures figures = figures(one);
    assertThat(
            List.of(
                figures.saddleMm(),
                figures.lowMm(),
                figures.highMm(),
                figures.cents12After(),
                figures.rmsBefore(),
                figures.rmsAfter()))
        .allMatch(Double::isFinite);
    assertThat(one.neck())
        .allMatch(note -> Double.isFinite(note.nowCents()) && Double.isFinite(note.afterCents()));
  }

  private static double after(MoveAdvice advice, int fret) {
    return advice.neck().stream()
        .filter(note -> note.fret() == fret)
        .mapToDouble(FretCents::afterCents)
        .findFirst()
        .orElseThrow();
  }

  private static List<String> words(InstrumentAdvice advice, int string) {
    return advice.strings().get(string - 1).findings().stream().map(FindingReport::word).toList();
  }

  private static MoveFigures figures(MoveAdvice advice) {
    assertThat(advice.figures()).isNotNull();
    return advice.figures();
  }

  private InstrumentAdvice advise(List<String> rows, NutMovable nut, AimChoice aim) {
    SaddleRoom room = new SaddleRoom(0.5, null, null, null, null, nut);
    return advisor.advise(NeckStrings.read(rows, room), aim);
  }

  private static SaddleRoom room() {
    return SaddleRoom.NOT_KNOWN;
  }
}
