package sillet.desktop.history;

import java.util.ArrayList;
import java.util.List;
import sillet.desktop.controls.Eighths;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.Neck;
import sillet.logbook.moves.Direction;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.BenchCheck;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.MadeMove;
import sillet.logbook.visits.VisitRecord;
import sillet.logbook.visits.WorkLine;

/** The sentences and figures of a history. */
final class HistoryWords {
  private static final int MM_DECIMALS = 2;
  private static final int INCH_DECIMALS = 3;

  private final Texts texts;
  private final LengthUnit unit;

  HistoryWords(Texts texts, LengthUnit unit) {
    this.texts = texts;
    this.unit = unit;
  }

  /** Serial, strings, scale and saddles in one line. */
  String facts(Instrument instrument) {
    List<String> parts = new ArrayList<>();
    if (!instrument.serial().isBlank()) {
      parts.add(texts.say("history.serial", instrument.serial()));
    }
    if (!instrument.tag().isBlank()) {
      parts.add(texts.say("history.tag", instrument.tag()));
    }
    parts.add(texts.say(instrument.kind().key()));
    Neck neck = instrument.neck();
    parts.add(texts.say("history.strings", Integer.toString(neck.strings()), scale(neck)));
    if (neck.leftHanded()) {
      parts.add(texts.say("history.left-handed"));
    }
    parts.add(texts.say(instrument.saddle().kind().key()));
    return String.join(" · ", parts);
  }

  /** A length in the shop's unit, without the unit. */
  String length(double mm) {
    return unit == LengthUnit.MM
        ? Figures.fixed(mm, MM_DECIMALS)
        : Figures.fixed(mm / LengthUnit.MM_PER_INCH, INCH_DECIMALS);
  }

  /** The unit of {@link #length}. */
  String unit() {
    return unit == LengthUnit.MM ? texts.say("history.mm") : texts.say("history.inch");
  }

  /** What was done in a visit, in one line; what was asked for while nothing is done yet. */
  String done(VisitRecord visit) {
    List<String> parts = new ArrayList<>();
    long moved = visit.moves().stream().map(MadeMove::string).distinct().count();
    if (moved == 1) {
      parts.add(texts.say("history.one-moved"));
    } else if (moved > 1) {
      parts.add(texts.say("history.moved", Long.toString(moved)));
    }
    visit.work().stream().map(WorkLine::text).forEach(parts::add);
    return parts.isEmpty() ? visit.visit().arrival().request() : String.join(" · ", parts);
  }

  /** What was measured, and where. */
  String check(CheckLine.What what) {
    String kind = texts.say(what.kind().key());
    String fret = Integer.toString(what.fret());
    if (what.string() == BenchCheck.WHOLE_NECK) {
      return texts.say("history.check-neck", kind, fret);
    }
    String string = Integer.toString(what.string());
    return what.kind() == CheckKind.ACTION
        ? texts.say("history.check-fret", kind, fret, string)
        : texts.say("history.check-string", kind, string);
  }

  /** Turns of the screw to the nearest eighth, as a hand sets them; blank where none was turned. */
  String turns(MadeMove move) {
    if (move.turns() == null) {
      return "";
    }
    Eighths turns = Eighths.of(move.turns());
    return turns.turns() <= 1
        ? texts.say("history.turn", turns.written())
        : texts.say("history.turns", turns.written());
  }

  /** How far a saddle was moved and which way. */
  String moved(MadeMove move) {
    Direction direction =
        move.saddleMm() == 0
            ? Direction.STAY
            : move.saddleMm() > 0 ? Direction.AWAY : Direction.TOWARD;
    return texts.say(
        "history.move", length(Math.abs(move.saddleMm())), unit(), texts.say(direction.key()));
  }

  private String scale(Neck neck) {
    String treble = Figures.fixed(neck.scaleTrebleMm(), 0);
    String bass = Figures.fixed(neck.scaleBassMm(), 0);
    return treble.equals(bass) ? treble : texts.say("history.scales", treble, bass);
  }
}
