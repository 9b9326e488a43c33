package sillet.desktop.history;

import java.util.ArrayList;
import java.util.List;
import sillet.logbook.learned.LearnedFigure;
import sillet.logbook.learned.LearnedFret;
import sillet.logbook.learned.LearnedInstrument;
import sillet.logbook.learned.LearnedString;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** What has been learned of an instrument, in words and figures with their 95 % interval. */
final class LearnedWords {
  private static final int DECIMALS = 2;

  private final Texts texts;
  private final LearnedInstrument learned;

  /**
   * One string.
   *
   * @param number of it
   * @param stretch how stiff it is in stretch, 1 as the packet lets expect
   * @param gap over fret 1, millimetres
   * @param passes how often it was read through
   */
  record Row(String number, String stretch, String gap, String passes) {}

  LearnedWords(Texts texts, LearnedInstrument learned) {
    this.texts = texts;
    this.learned = learned;
  }

  /** From how much it was learned. */
  String from() {
    return texts.say(
        "history.learned-from",
        Integer.toString(learned.passes()),
        Integer.toString(learned.visits()));
  }

  /** What all strings share. */
  List<String> shared() {
    List<String> said = new ArrayList<>();
    said.add(nut(learned.nutMm()));
    said.add(
        texts.say(
            "history.learned-ends",
            fixed(learned.heldEnds().value()),
            between(learned.heldEnds())));
    for (LearnedFret fret : learned.frets()) {
      said.add(fret(fret));
    }
    if (learned.frets().isEmpty()) {
      said.add(texts.say("history.learned-no-fret"));
    }
    return said;
  }

  private String nut(LearnedFigure mm) {
    if (!mm.differsFrom(0)) {
      return texts.say("history.learned-nut-right", between(mm));
    }
    String way = fixed(Math.abs(mm.value()));
    return mm.value() > 0
        ? texts.say("history.learned-nut-near", way, between(mm))
        : texts.say("history.learned-nut-far", way, between(mm));
  }

  private String fret(LearnedFret fret) {
    String number = Integer.toString(fret.fret());
    String way = fixed(Math.abs(fret.offMm().value()));
    return fret.offMm().value() > 0
        ? texts.say("history.learned-fret-bridge", number, way, between(fret.offMm()))
        : texts.say("history.learned-fret-nut", number, way, between(fret.offMm()));
  }

  /** A row a string. */
  List<Row> rows() {
    return learned.strings().stream().map(this::row).toList();
  }

  private Row row(LearnedString string) {
    return new Row(
        Integer.toString(string.string()),
        with(string.stretchFactor()),
        with(string.gapAtFirstMm()),
        Integer.toString(string.passes()));
  }

  private String with(LearnedFigure figure) {
    return texts.say("history.learned-figure", fixed(figure.value()), between(figure));
  }

  private String between(LearnedFigure figure) {
    return texts.say("history.learned-between", fixed(figure.low()), fixed(figure.high()));
  }

  private static String fixed(double value) {
    return Figures.fixed(value, DECIMALS);
  }
}
