package sillet.desktop.forecast;

import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import sillet.logbook.forecast.InstrumentForecast;
import sillet.logbook.forecast.StringForecast;
import sillet.logbook.forecast.StringTension;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.Verdict;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** Puts a forecast into words. */
final class ForecastWords {
  private static final int MM_DECIMALS = 2;
  private static final double PERCENT = 100;
  private static final double NEWTONS_PER_KILOGRAM = 9.80665;

  /** Sentences that say again what the figures of the row say. */
  private static final Set<String> IN_THE_ROW =
      Set.of(
          "outlook.lighter",
          "outlook.same",
          "outlook.heavier",
          "outlook.leave",
          "outlook.away",
          "outlook.toward");

  private final Texts texts;

  ForecastWords(Texts texts) {
    this.texts = texts;
  }

  /** One string. */
  ForecastLine line(StringForecast string) {
    StringTension tension = string.tension();
    MoveFigures figures = string.figures();
    return new ForecastLine(
        tension == null ? "" : newtons(tension.nowN()),
        tension == null ? "" : newtons(tension.thenN()),
        tension == null ? "" : texts.say(tension.feel().key()),
        breaking(tension),
        figures == null ? "" : Figures.signed(figures.cents12Before(), 1),
        move(string, figures),
        interval(figures),
        nut(figures),
        string.verdict() != Verdict.LEAVE || figures == null,
        string.notes().stream()
            .filter(note -> !IN_THE_ROW.contains(note.key()))
            .map(texts::say)
            .toList());
  }

  private static String newtons(double tensionN) {
    return Figures.fixed(tensionN, 1);
  }

  private static String breaking(@Nullable StringTension tension) {
    Double share = tension == null ? null : tension.breakingShareThen();
    return share == null ? "" : Figures.fixed(share * PERCENT, 0) + "\u00a0%";
  }

  private String move(StringForecast string, @Nullable MoveFigures figures) {
    if (figures == null) {
      return texts.say("visit.words.not-solved");
    }
    if (string.verdict() == Verdict.LEAVE) {
      return texts.say("visit.words.leave");
    }
    String mm = Figures.fixed(Math.abs(figures.saddleMm()), MM_DECIMALS);
    String move = texts.say("forecast.move", mm, texts.say(figures.direction().key()));
    return switch (string.verdict()) {
      case NO_ROOM -> texts.say("forecast.no-room", move);
      case SLOT -> texts.say("forecast.slot", move);
      case MOVE, LEAVE -> move;
    };
  }

  private String interval(@Nullable MoveFigures figures) {
    if (figures == null) {
      return "";
    }
    return texts.say(
        "visit.words.range",
        Figures.signed(figures.lowMm(), MM_DECIMALS),
        Figures.signed(figures.highMm(), MM_DECIMALS));
  }

  private String nut(@Nullable MoveFigures figures) {
    Double nut = figures == null ? null : figures.nutMm();
    if (nut == null) {
      return "";
    }
    String mm = Figures.fixed(Math.abs(nut), MM_DECIMALS);
    return nut > 0
        ? texts.say("visit.words.nut-toward-bridge", mm)
        : texts.say("visit.words.nut-away", mm);
  }

  /** The pull of all strings together. */
  String pull(InstrumentForecast forecast) {
    double change = forecast.pullThenN() - forecast.pullNowN();
    return texts.say(
        "forecast.pull",
        Figures.fixed(forecast.pullNowN(), 0),
        Figures.fixed(forecast.pullThenN(), 0),
        Figures.signed(change, 0),
        Figures.signed(change / NEWTONS_PER_KILOGRAM, 1));
  }

  /** What must be done or read again. */
  List<String> redo(InstrumentForecast forecast) {
    return forecast.redo().stream().map(texts::say).toList();
  }

  /** Where it can hurt. */
  List<String> cautions(InstrumentForecast forecast) {
    return forecast.cautions().stream().map(texts::say).toList();
  }
}
