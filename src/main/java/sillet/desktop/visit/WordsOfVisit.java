package sillet.desktop.visit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sillet.desktop.visit.words.BridgeLine;
import sillet.desktop.visit.words.FindingLine;
import sillet.desktop.visit.words.FindingLines;
import sillet.desktop.visit.words.MoveWords;
import sillet.desktop.visit.words.StringWords;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.StringPass;

/** Everything the page says of the strings in the pass that is looked at. */
final class WordsOfVisit {
  private final Texts texts;
  private final MoveWords words;
  private final FindingLines findings;

  WordsOfVisit(Texts texts, MoveAdvisor advisor) {
    this.texts = texts;
    this.words = new MoveWords(texts);
    this.findings = new FindingLines(texts, advisor);
  }

  /** The words beside each string, string 1 first. */
  List<StringWords> of(VisitModel model) {
    List<StringPass> before = model.before();
    List<StringWords> said = new ArrayList<>();
    for (int row = 0; row < model.strings().size(); row++) {
      StringPass string = model.strings().get(row);
      said.add(words.of(string, before.isEmpty() ? null : before.get(row)));
    }
    return said;
  }

  /** What stands below the drawing. */
  List<FindingLine> findings(VisitModel model) {
    return findings.of(model.now());
  }

  /** What a saddle or bridge in one piece can do; empty where each string has its own. */
  Optional<BridgeLine> bridge(VisitModel model) {
    SaddleKind kind = model.record().instrument().saddle().kind();
    return Optional.ofNullable(model.now().bridge())
        .map(advice -> BridgeLine.of(advice, kind, texts));
  }

  /** What clockwise does; empty while it is not known. */
  String sense(VisitModel model) {
    Saddle saddle = model.record().instrument().saddle();
    if (saddle.kind() != SaddleKind.SCREW || saddle.screwSense() == ScrewSense.NOT_KNOWN) {
      return "";
    }
    return saddle.screwSense() == ScrewSense.CLOCKWISE_AWAY
        ? texts.say("visit.words.clockwise-away")
        : texts.say("visit.words.clockwise-toward");
  }

  /** What the moves serve, in short. */
  String aim(VisitModel model) {
    AimChoice aim = model.aim().aim();
    return switch (aim.kind()) {
      case OCTAVE -> texts.say("visit.words.for-octave");
      case NECK -> texts.say("visit.words.for-neck");
      case FRETS -> texts.say("visit.words.for-frets", aim.word());
    };
  }
}
