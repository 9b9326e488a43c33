package sillet.desktop.visit.words;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** Puts causes into words and says where they show. */
final class ReportLines {
  /** Below this a cure is not worth naming in cents: no tuner shows it. */
  private static final double LEAST_WORTH_CENTS = 0.05;

  private final Texts texts;

  ReportLines(Texts texts) {
    this.texts = texts;
  }

  FindingLine line(FindingReport report) {
    Integer string = report.string();
    return new FindingLine(
        string == null ? List.of() : List.of(string),
        spot(report),
        head(report),
        texts.say(report.evidence()),
        texts.say(report.whatToDo()),
        worth(report.worthCents()),
        said(report.caution()));
  }

  private String said(@Nullable Message message) {
    return message == null ? "" : texts.say(message);
  }

  private String worth(double cents) {
    return cents < LEAST_WORTH_CENTS
        ? ""
        : texts.say("visit.findings.worth", Figures.fixed(cents, 1));
  }

  private static FindingSpot spot(FindingReport report) {
    Integer fret = report.fret();
    int at = fret == null ? 0 : fret;
    return switch (report.kind()) {
      case READING -> new FindingSpot(FindingSpot.Part.NOTE, at);
      case STRING -> FindingSpot.at(FindingSpot.Part.STRING);
      case NUT_HIGH, NUT_FAR, NUT_NEAR -> FindingSpot.at(FindingSpot.Part.NUT);
      case FRET -> new FindingSpot(FindingSpot.Part.FRET, at);
      case ACTION -> FindingSpot.at(FindingSpot.Part.NOWHERE);
    };
  }

  private String head(FindingReport report) {
    Integer string = report.string();
    String name = name(report);
    return string == null
        ? name
        : texts.say("visit.findings.string", name, Integer.toString(string));
  }

  private String name(FindingReport report) {
    return switch (report.kind()) {
      case READING -> texts.say("visit.findings.reading");
      case STRING -> texts.say("visit.findings.false-string");
      case NUT_HIGH -> texts.say("visit.findings.nut-high");
      case NUT_FAR -> texts.say("visit.findings.nut-far");
      case NUT_NEAR -> texts.say("visit.findings.nut-near");
      case ACTION -> texts.say("visit.findings.action");
      case FRET -> fret(report);
    };
  }

  private String fret(FindingReport report) {
    Integer at = report.fret();
    String fret = at == null ? "" : Integer.toString(at);
    return report.slanted()
        ? texts.say("visit.findings.fret-slanted", fret)
        : texts.say("visit.findings.fret-off", fret);
  }
}
