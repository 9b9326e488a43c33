package sillet.logbook.moves;

import java.util.OptionalInt;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.findings.Evidence.Measure;
import sillet.acoustics.findings.NeckFinding;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;

/**
 * A finding of the physics put into the words of the bench: evidence, what to do first, caution.
 */
final class FindingWords {
  private static final double MM_PER_M = 1e3;
  private static final int MM_DECIMALS = 2;

  private final NeckFinding found;
  private final KnownNeck neck;

  FindingWords(NeckFinding found, KnownNeck neck) {
    this.found = found;
    this.neck = neck;
  }

  FindingReport report() {
    return switch (found.kind()) {
      case READING -> of(Finding.READING, reading(), Message.of("finding.reading.do"), null);
      case STRING -> of(Finding.STRING, string(), Message.of("finding.string.do"), tension());
      case NUT_HIGH -> of(Finding.NUT_HIGH, nutHigh(), Message.of("finding.nut-high.do"), cut());
      case NUT_FAR -> of(Finding.NUT_FAR, nutFar(), Message.of("finding.nut-far.do"), cut());
      case NUT_NEAR ->
          of(Finding.NUT_NEAR, nutNear(), Message.of("finding.nut-near.do"), tension());
      case FRET -> of(Finding.FRET, fret(), Message.of("finding.fret.do"), fretCut());
      case ACTION -> of(Finding.ACTION, action(), Message.of("finding.action.do"), tension());
    };
  }

  private FindingReport of(
      Finding kind, Message evidence, Message whatToDo, @Nullable Message caution) {
    Integer string =
        found.string().isPresent() ? Integer.valueOf(neck.number(found.string().getAsInt())) : null;
    Integer fret = found.fret().isPresent() ? Integer.valueOf(found.fret().getAsInt()) : null;
    double worth = Math.max(0, found.worthCents());
    return new FindingReport(
        kind, string, fret, found.slanted(), worth, evidence, whatToDo, caution);
  }

  private Message reading() {
    double off = found.evidence(Measure.CENTS_OFF).orElse(0);
    return Message.of(
        "finding.reading.evidence",
        number(),
        number(found.fret()),
        Figures.signed(off, 1),
        Figures.fixed(found.evidence(Measure.CENTS_SD).orElse(0), 1));
  }

  private Message string() {
    return Message.of(
        "finding.string.evidence",
        number(),
        Figures.fixed(found.evidence(Measure.TIMES_WIDER).orElse(found.amount()), 1),
        Figures.signed(found.evidence(Measure.CENTS_OFF).orElse(0), 1));
  }

  private Message nutHigh() {
    return Message.of(
        "finding.nut-high.evidence",
        number(),
        mm(found.evidence(Measure.GAP).orElse(0)),
        mm(found.evidence(Measure.GAP_OF_NEIGHBOURS).orElse(0)),
        Figures.signed(found.evidence(Measure.CENTS).orElse(0), 1));
  }

  private Message nutFar() {
    return Message.of("finding.nut-far.evidence", mm(found.amount()), allNotes());
  }

  private Message nutNear() {
    return Message.of("finding.nut-near.evidence", mm(found.amount()), allNotes());
  }

  private String allNotes() {
    return Figures.fixed(Math.abs(found.evidence(Measure.CENTS).orElse(0)), 1);
  }

  private Message fret() {
    String read = Figures.fixed(found.evidence(Measure.STRINGS_READ).orElse(0), 0);
    if (found.slanted()) {
      return Message.of(
          "finding.fret.slanted",
          number(found.fret()),
          signedMm(found.evidence(Measure.PLACE_AT_FIRST).orElse(0)),
          signedMm(found.evidence(Measure.PLACE_AT_LAST).orElse(0)),
          read);
    }
    String cents = Figures.signed(found.evidence(Measure.CENTS).orElse(0), 1);
    String agreeing = Figures.fixed(found.evidence(Measure.STRINGS_AGREEING).orElse(0), 0);
    return found.amount() > 0
        ? Message.of(
            "finding.fret.to-bridge",
            number(found.fret()),
            mm(found.amount()),
            cents,
            agreeing,
            read)
        : Message.of(
            "finding.fret.to-nut", number(found.fret()), mm(found.amount()), cents, agreeing, read);
  }

  private Message action() {
    return Message.of(
        "finding.action.evidence",
        number(),
        mm(found.evidence(Measure.ACTION).orElse(0)),
        mm(found.evidence(Measure.TARGET).orElse(0)),
        Figures.signed(found.evidence(Measure.CENTS).orElse(0), 1));
  }

  private static Message tension() {
    return Message.of("finding.caution.tension");
  }

  private static Message cut() {
    return Message.of("finding.caution.nut");
  }

  private static Message fretCut() {
    return Message.of("finding.caution.fret");
  }

  private String number() {
    return found.string().isPresent()
        ? Integer.toString(neck.number(found.string().getAsInt()))
        : "";
  }

  private static String number(OptionalInt fret) {
    return fret.isPresent() ? Integer.toString(fret.getAsInt()) : "";
  }

  private static String mm(double metres) {
    return Figures.fixed(Math.abs(metres) * MM_PER_M, MM_DECIMALS);
  }

  private static String signedMm(double metres) {
    return Figures.signed(metres * MM_PER_M, MM_DECIMALS);
  }
}
