package sillet.logbook.forecast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.offset;
import static org.assertj.core.api.Assertions.within;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;
import sillet.logbook.learned.NeckVisits;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.BenchHistory;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NeckStrings;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.moves.Verdict;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Pitch;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.VisitRecord;

class ForecasterTest {
  private static final LocalDate DAY = LocalDate.of(2026, 1, 5);
  private static final List<String> UNREAD = List.of("", "", "", "", "", "");

  private final Forecaster forecaster = new Forecaster(75);

  @Test
  void nothingToRedoWhereNothingChanges() {
    InstrumentForecast same = forecast(NeckStrings.CLEAN, List.of());
    assertThat(same.redo()).isEmpty();
    assertThat(same.cautions()).isEmpty();
    // saddles moved by some millimetres of 648 change the tension by less than 1 % [D]
    assertThat(same.pullThenN()).isCloseTo(same.pullNowN(), within(0.01 * same.pullNowN()));
    assertThat(same.strings())
        .allSatisfy(one -> assertThat(one.tension().feel()).isEqualTo(StringFeel.SAME));
  }

  @Test
  void tensionGoesWithTheSquareOfThePitch() {
    InstrumentForecast tone = forecast(UNREAD, List.of(tuned(1, "D4")));
    StringTension first = tone.strings().get(0).tension();
    // a tone lower: 2^(-2/12) in pitch, 2^(-4/12) in tension [D]
    assertThat(first.thenN() / first.nowN()).isCloseTo(Math.pow(2, -4.0 / 12), offset(0.004));
    assertThat(first.feel()).isEqualTo(StringFeel.LIGHTER);
    assertThat(tone.pullThenN()).isLessThan(tone.pullNowN());
    assertThat(keys(tone)).contains("redo.relief-less", "redo.intonation", "redo.heights");
    assertThat(keys(tone)).doesNotContain("redo.settle", "redo.slots-wider");
  }

  @Test
  void heavierStringsAskForSlotsAndRelief() {
    InstrumentForecast heavier =
        forecast(NeckStrings.CLEAN, List.of(gauge(1, .011), gauge(5, .038), gauge(6, .049)));
    assertThat(keys(heavier))
        .containsExactly(
            "redo.relief-more",
            "redo.springs",
            "redo.slots-wider",
            "redo.settle",
            "redo.heights",
            "redo.pickups",
            "redo.intonation");
    assertThat(heavier.redo().get(2).values()).containsExactly("1, 5, 6");
    assertThat(heavier.cautions())
        .extracting(Message::key)
        .containsExactly("finding.caution.tension", "finding.caution.nut", "redo.caution-pull");
    for (Message one : heavier.redo()) {
      assertThat(Texts.english().say(one)).doesNotContainIgnoringCase("rod");
    }
  }

  @Test
  void readingsMakeTheForecastSurer() {
    List<StringChange> lower = List.of(tuned(6, "D2"));
    MoveFigures read = figures(forecast(NeckStrings.CLEAN, lower), 6);
    MoveFigures unread = figures(forecast(UNREAD, lower), 6);
    assertThat(read.highMm() - read.lowMm()).isLessThan(0.5 * (unread.highMm() - unread.lowMm()));
  }

  @Test
  void usesWhatTheVisitTaughtAndWhereItsSaddleStandsNow() {
    VisitRecord visit = NeckVisits.read(1, DAY, DAY, NeckStrings.CLEAN);
    VisitRecord moved = NeckVisits.moved(visit, 1, 2.0, 1.5, 3.0, 0.4, 1.2, -0.2);
    InstrumentChange lower = new InstrumentChange(List.of(tuned(3, "F3")), 0);
    double before = figures(forecaster.ofVisit(visit, InstrumentPast.NONE, lower), 3).saddleMm();
    double after = figures(forecaster.ofVisit(moved, InstrumentPast.NONE, lower), 3).saddleMm();
    assertThat(after).isCloseTo(before - 3.0, offset(0.1));
  }

  @Test
  void actionAloneShiftsIntonationAndTouchesNoSlot() {
    StringChange higher = new StringChange(1, null, null, null, null, null, 2.6);
    InstrumentForecast forecast = forecast(NeckStrings.CLEAN, List.of(higher));
    Message said =
        forecast.strings().get(0).notes().stream()
            .filter(note -> note.key().equals("outlook.action"))
            .findFirst()
            .orElseThrow();
    // from 1.6 mm to 2.6 mm stretches the string more: sharper
    assertThat(said.values().get(2)).startsWith("+");
    assertThat(keys(forecast)).containsExactly("redo.action", "redo.pickups", "redo.intonation");
  }

  @Test
  void saysWhatDoesNotFitIntoTheTravel() {
    SaddleRoom tight =
        new SaddleRoom(0.5, 0.2, 0.2, null, null, sillet.logbook.moves.NutMovable.NO);
    List<BenchHistory> strings =
        NeckStrings.read(NeckStrings.CLEAN, tight).stream().map(BenchHistory::of).toList();
    InstrumentForecast forecast =
        forecaster.forecast(strings, new InstrumentChange(List.of(), 0), AimChoice.OCTAVE);
    assertThat(forecast.strings().get(2).verdict()).isEqualTo(Verdict.NO_ROOM);
  }

  @Test
  void aCapoIsAnsweredForEveryString() {
    List<BenchHistory> strings = histories(NeckStrings.CLEAN);
    InstrumentForecast forecast =
        forecaster.forecast(strings, new InstrumentChange(List.of(), 3), AimChoice.OCTAVE);
    assertThat(forecast.strings())
        .allSatisfy(
            one -> assertThat(one.notes()).extracting(Message::key).contains("outlook.capo"));
  }

  @Test
  void refusesAStringThatCannotBe() {
    StringChange thick = new StringChange(6, null, .046, null, .046, null, null);
    assertThatThrownBy(() -> forecast(NeckStrings.CLEAN, List.of(thick)))
        .isInstanceOf(Rejection.class);
  }

  @Test
  void aStringThatNoTensionTunesStopsNoOther() {
    StringChange impossible =
        new StringChange(1, Pitch.parse("25", 440), .150, null, null, null, null);
    InstrumentForecast forecast = forecast(NeckStrings.CLEAN, List.of(impossible));
    for (int string = 2; string <= 6; string++) {
      assertThat(figures(forecast, string).saddleMm()).isFinite();
    }
    assertThat(forecast.pullThenN()).isFinite();
  }

  @Test
  void aThirdThatBecomesWoundNamesIt() {
    StringChange wound =
        new StringChange(3, null, .020, Construction.WOUND_NICKEL, null, null, null);
    InstrumentForecast forecast = forecast(NeckStrings.CLEAN, List.of(wound));
    assertThat(keys(forecast)).contains("redo.plain-wound");
    assertThat(figures(forecast, 3).saddleMm()).isLessThan(figures(same(), 3).saddleMm());
  }

  private InstrumentForecast same() {
    return forecast(NeckStrings.CLEAN, List.of());
  }

  private InstrumentForecast forecast(List<String> rows, List<StringChange> changes) {
    return forecaster.forecast(histories(rows), new InstrumentChange(changes, 0), AimChoice.OCTAVE);
  }

  private static List<BenchHistory> histories(List<String> rows) {
    return NeckStrings.read(rows, SaddleRoom.NOT_KNOWN).stream().map(BenchHistory::of).toList();
  }

  private static StringChange tuned(int string, String pitch) {
    return new StringChange(string, Pitch.parse(pitch, 440), null, null, null, null, null);
  }

  private static StringChange gauge(int string, double gaugeIn) {
    return new StringChange(string, null, gaugeIn, null, null, null, null);
  }

  private static MoveFigures figures(InstrumentForecast forecast, int string) {
    MoveFigures figures = forecast.strings().get(string - 1).figures();
    assertThat(figures).isNotNull();
    return figures;
  }

  private static List<String> keys(InstrumentForecast forecast) {
    return forecast.redo().stream().map(Message::key).toList();
  }
}
