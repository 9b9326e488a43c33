package sillet.desktop.visit;

import java.util.List;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.visit.checks.ChecksModel;
import sillet.desktop.visit.words.StringWords;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.Moment;

/** How far each part of the page is. */
final class SectionStates {
  private final Texts texts;
  private final VisitModel model;
  private final ChecksModel checks;
  private final WordsOfVisit said;

  SectionStates(Texts texts, VisitModel model, ChecksModel checks, WordsOfVisit said) {
    this.texts = texts;
    this.model = model;
    this.checks = checks;
    this.said = said;
  }

  /** Readings: what is to move goes before what is to read. */
  Section.State read() {
    List<StringWords> words = said.of(model);
    long moves = words.stream().filter(string -> string.kind().moves()).count();
    long unread = words.stream().filter(s -> s.kind() == StringWords.Kind.NOT_READ).count();
    if (moves > 0) {
      String count = texts.say("visit.state.to-move", Long.toString(moves));
      String both =
          unread == 0 ? count : texts.say("visit.state.to-read-too", count, Long.toString(unread));
      return new Section.State(MarkShape.MOVE, both, true);
    }
    if (unread > 0) {
      String count = texts.say("visit.state.to-read", Long.toString(unread));
      return new Section.State(MarkShape.NOT_YET, count, false);
    }
    return done();
  }

  /** Findings: how many there are. */
  Section.State found() {
    int count = said.findings(model).size();
    if (count > 0) {
      return new Section.State(MarkShape.FINDING, Integer.toString(count), true);
    }
    return model.strings().stream().allMatch(string -> string.advice() == null) ? notYet() : done();
  }

  Section.State checked() {
    long received = checks.made(Moment.RECEIVED);
    long left = checks.made(Moment.LEFT);
    if (received + left == 0) {
      return notYet();
    }
    String count = texts.say("visit.state.checks", Long.toString(received), Long.toString(left));
    return new Section.State(left > 0 ? MarkShape.DONE : MarkShape.NOT_YET, count, false);
  }

  Section.State room() {
    return model.record().visit().travel().isEmpty() ? notYet() : done();
  }

  Section.State worked() {
    return model.record().work().isEmpty() ? notYet() : done();
  }

  Section.State noted() {
    return model.record().notes().isEmpty() ? notYet() : done();
  }

  Section.State out() {
    return model.open() ? notYet() : done();
  }

  private static Section.State done() {
    return new Section.State(MarkShape.DONE, "", false);
  }

  private static Section.State notYet() {
    return new Section.State(MarkShape.NOT_YET, "", false);
  }
}
