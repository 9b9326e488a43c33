package sillet.logbook.learned;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.offset;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NeckStrings;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitPass;
import sillet.logbook.visits.VisitRecord;

/** Passes and visits of one instrument teach what it is like. */
class LearningTest {
  private static final LocalDate FITTED = LocalDate.of(2026, 1, 2);
  private static final LocalDate FIRST = LocalDate.of(2026, 1, 5);
  private static final LocalDate LATER = LocalDate.of(2027, 3, 1);

  private static final double[] MOVES_MM = {2.0, 1.5, 3.0, 0.4, 1.2, -0.2};

  private final MoveAdvisor advisor = new MoveAdvisor(75);

  @Test
  void knowsNothingBeforeAnythingIsRead() {
    VisitRecord unread = NeckVisits.read(1, FIRST, FITTED, List.of("", "", "", "", "", ""));
    assertThat(Learning.of(unread, InstrumentPast.NONE)).isEmpty();
  }

  @Test
  void tellsOfEveryStringAndFromHowMuchItComes() {
    VisitRecord visit = NeckVisits.read(1, FIRST, FITTED, NeckStrings.CLEAN);
    LearnedInstrument learned = Learning.of(visit, InstrumentPast.NONE).orElseThrow();
    assertThat(learned.passes()).isEqualTo(1);
    assertThat(learned.visits()).isEqualTo(1);
    assertThat(learned.strings())
        .extracting(LearnedString::string)
        .containsExactly(1, 2, 3, 4, 5, 6);
    assertThat(learned.strings())
        .allSatisfy(
            one -> {
              assertThat(one.stretchFactor().low()).isLessThan(one.stretchFactor().value());
              assertThat(one.stretchFactor().value()).isBetween(0.7, 1.4);
              assertThat(one.passes()).isEqualTo(1);
            });
    assertThat(learned.frets()).isEmpty();
    assertThat(learned.nutMm().differsFrom(0)).isFalse();
  }

  @Test
  void namesAFretThatIsOffAndANutThatStandsTooFar() {
    VisitRecord fret = NeckVisits.read(1, FIRST, FITTED, NeckStrings.SLOT_AND_FRET);
    LearnedInstrument learned = Learning.of(fret, InstrumentPast.NONE).orElseThrow();
    assertThat(learned.frets()).extracting(LearnedFret::fret).contains(7);
    VisitRecord nut = NeckVisits.read(1, FIRST, FITTED, NeckStrings.NUT_FAR);
    LearnedFigure place = Learning.of(nut, InstrumentPast.NONE).orElseThrow().nutMm();
    // too far from fret 1 is away from the bridge
    assertThat(place.value()).isNegative();
    assertThat(place.differsFrom(0)).isTrue();
  }

  @Test
  void aPassAfterAKnownMoveShrinksTheInterval() {
    VisitRecord once = NeckVisits.read(1, FIRST, FITTED, NeckStrings.CLEAN);
    VisitRecord moved = NeckVisits.moved(once, 1, MOVES_MM);
    VisitRecord twice = NeckVisits.reading(moved, 2, NeckStrings.MOVED);
    LearnedInstrument after = Learning.of(twice, InstrumentPast.NONE).orElseThrow();
    assertThat(after.passes()).isEqualTo(2);
    List<VisitPass> passes = VisitMoves.passes(forTheNeck(twice), InstrumentPast.NONE, advisor);
    for (int i = 0; i < 6; i++) {
      MoveFigures first = figures(passes.get(0), i + 1);
      MoveFigures second = figures(passes.get(1), i + 1);
      assertThat(second.highMm() - second.lowMm()).isLessThan(first.highMm() - first.lowMm());
      // and what is left to do agrees with what was asked for and done
      assertThat(second.saddleMm())
          .isCloseTo(
              first.saddleMm() - MOVES_MM[i], offset(0.5 * (first.highMm() - first.lowMm())));
    }
  }

  @Test
  void anEarlierVisitSharpensTheNextAndAResetTakesThatBack() {
    VisitRecord first = NeckVisits.read(1, FIRST, FITTED, NeckStrings.CLEAN);
    List<String> onlyOctaves =
        List.of(",,,,,,4.9", ",,,,,,3.0", ",,,,,,6.9", ",,,,,,0.0", ",,,,,,1.8", ",,,,,,-2.6");
    VisitRecord second = NeckVisits.read(2, LATER, null, onlyOctaves);
    InstrumentPast past = new InstrumentPast(List.of(first), null);
    InstrumentPast reset = new InstrumentPast(List.of(first), NeckVisits.at(second));
    LearnedInstrument taught = Learning.of(second, past).orElseThrow();
    LearnedInstrument alone = Learning.of(second, InstrumentPast.NONE).orElseThrow();
    LearnedInstrument forgotten = Learning.of(second, reset).orElseThrow();
    assertThat(taught.visits()).isEqualTo(2);
    assertThat(taught.passes()).isEqualTo(2);
    assertThat(width(taught.nutMm())).isLessThan(width(alone.nutMm()));
    assertThat(forgotten.visits()).isEqualTo(1);
    assertThat(forgotten.nutMm()).isEqualTo(alone.nutMm());
    assertThat(forgotten.strings()).isEqualTo(alone.strings());
    // whole necks too: what the first visit taught is used for the advice of the second
    assertThat(rmsBefore(second, past, 3)).isNotEqualTo(rmsBefore(second, reset, 3));
    assertThat(rmsBefore(second, reset, 3)).isEqualTo(rmsBefore(second, InstrumentPast.NONE, 3));
  }

  @Test
  void theSameSetTeachesMoreThanAnother() {
    VisitRecord first = NeckVisits.read(1, FIRST, FITTED, NeckStrings.CLEAN);
    List<String> octaves =
        List.of(",,,,,,4.9", ",,,,,,3.0", ",,,,,,6.9", ",,,,,,0.0", ",,,,,,1.8", ",,,,,,-2.6");
    InstrumentPast past = new InstrumentPast(List.of(first), null);
    VisitRecord same = NeckVisits.read(2, FIRST.plusDays(3), FITTED, octaves);
    VisitRecord other = NeckVisits.read(2, FIRST.plusDays(3), FIRST.plusDays(2), octaves);
    double widthSame = 0;
    double widthOther = 0;
    for (int i = 0; i < 6; i++) {
      widthSame += width(Learning.of(same, past).orElseThrow().strings().get(i).stretchFactor());
      widthOther += width(Learning.of(other, past).orElseThrow().strings().get(i).stretchFactor());
    }
    assertThat(widthSame).isLessThan(widthOther);
  }

  @Test
  void aResetAfterTheLastReadingLeavesNothingLearned() {
    VisitRecord visit = NeckVisits.read(1, FIRST, FITTED, NeckStrings.CLEAN);
    InstrumentPast reset = new InstrumentPast(List.of(), NeckVisits.at(visit).plusSeconds(86400));
    assertThat(Learning.of(visit, reset)).isEmpty();
    assertThat(VisitMoves.passes(visit, reset, advisor).get(0).strings())
        .allMatch(string -> string.advice() != null);
  }

  private double rmsBefore(VisitRecord visit, InstrumentPast past, int string) {
    return figures(VisitMoves.passes(visit, past, advisor).get(0), string).rmsBefore();
  }

  private static MoveFigures figures(VisitPass pass, int string) {
    MoveFigures figures = pass.strings().get(string - 1).advice().figures();
    assertThat(figures).isNotNull();
    return figures;
  }

  private static VisitRecord forTheNeck(VisitRecord visit) {
    return new VisitRecord(
        visit.visit(),
        visit.instrument(),
        visit.customer(),
        visit.checks(),
        visit.readings(),
        visit.moves(),
        visit.work(),
        visit.notes(),
        new VisitAim(AimChoice.NECK, NutMovable.NO));
  }

  private static double width(LearnedFigure figure) {
    return figure.high() - figure.low();
  }
}
