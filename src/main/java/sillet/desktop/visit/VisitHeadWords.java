package sillet.desktop.visit;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sillet.acoustics.wire.ScrewThread;
import sillet.desktop.controls.Days;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.shop.Customer;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.visits.Arrival;
import sillet.logbook.visits.VisitRecord;

/** The sentences of the ticket at the head of the page. */
final class VisitHeadWords {
  private static final String BETWEEN = " \u00b7 ";
  private static final double SAME_PITCH_MM = 1e-6;
  private static final double MM_PER_M = 1e3;

  private final Texts texts;

  VisitHeadWords(Texts texts) {
    this.texts = texts;
  }

  /** Serial, strings, scale, saddles. */
  String instrument(Instrument instrument) {
    List<String> parts = new ArrayList<>();
    if (!instrument.serial().isEmpty()) {
      parts.add(texts.say("visit.head.serial", instrument.serial()));
    }
    if (!instrument.tag().isEmpty()) {
      parts.add(texts.say("visit.head.tag", instrument.tag()));
    }
    parts.add(strings(instrument.neck()));
    parts.add(saddle(instrument.saddle()));
    return String.join(BETWEEN, parts);
  }

  private String strings(Neck neck) {
    String count = Integer.toString(neck.strings());
    String treble = scale(neck.scaleTrebleMm());
    String said =
        neck.scaleBassMm() == neck.scaleTrebleMm()
            ? texts.say("visit.head.strings", count, treble)
            : texts.say("visit.head.strings-fanned", count, treble, scale(neck.scaleBassMm()));
    return neck.leftHanded() ? texts.say("visit.head.left-handed", said) : said;
  }

  private static String scale(double mm) {
    return Figures.fixed(mm, 1).replaceFirst("\\.0$", "");
  }

  private String saddle(Saddle saddle) {
    String kind = texts.say(saddle.kind().key());
    Double thickness = saddle.thicknessMm();
    Double screw = saddle.screwPitchMm();
    if (saddle.kind() == SaddleKind.ONE_PIECE && thickness != null) {
      return texts.say("visit.head.saddle-thick", kind, Figures.fixed(thickness, 1));
    }
    if (screw == null) {
      return kind;
    }
    return texts.say("visit.head.saddle-screw", kind, thread(screw));
  }

  /** The name of a thread where its pitch tells it, else the way of one turn. */
  private String thread(double mm) {
    ScrewThread nearest = ScrewThread.nearest(mm / MM_PER_M);
    boolean same = Math.abs(nearest.pitch() * MM_PER_M - mm) < SAME_PITCH_MM;
    String way = Figures.fixed(mm, 3).replaceFirst("0+$", "");
    return same && nearest.designation().startsWith("M")
        ? texts.say("visit.head.thread", nearest.designation(), way)
        : texts.say("visit.head.way", way);
  }

  /** Name and phone on one line. */
  String customer(VisitRecord record) {
    Customer customer = record.customer();
    if (customer == null) {
      return texts.say("visit.head.nobody");
    }
    return customer.phone().isEmpty()
        ? customer.name()
        : texts.say("visit.head.customer", customer.name(), customer.phone());
  }

  /** Promised, taken in, where it is. */
  List<String> days(VisitRecord record, boolean narrow) {
    Arrival arrival = record.visit().arrival();
    List<String> lines = new ArrayList<>();
    Optional<LocalDate> promised = Optional.ofNullable(arrival.promised());
    lines.add(
        promised
            .map(day -> texts.say("visit.head.promised", Days.near(day)))
            .orElseGet(() -> texts.say("visit.head.no-promise")));
    LocalDate out = record.visit().handedOut();
    String state =
        out == null
            ? texts.say("visit.head.on-the-bench")
            : texts.say("visit.head.handed-out", Days.near(out));
    if (!narrow) {
      String day = Days.near(arrival.takenIn());
      lines.add(
          arrival.takenInBy().isBlank()
              ? texts.say("visit.head.taken-in-on", day)
              : texts.say("visit.head.taken-in", day, arrival.takenInBy()));
    }
    lines.add(state);
    return lines;
  }
}
