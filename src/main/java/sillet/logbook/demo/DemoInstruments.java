package sillet.logbook.demo;

import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.shop.Customer;

/** Invented instruments of invented makers. */
final class DemoInstruments {
  static final Instrument LAPWING =
      instrument(
          InstrumentKind.ELECTRIC,
          "Brindlemoor Lapwing/D-0417",
          DemoPeople.PETRA,
          new Neck(6, 648, 648, 22, 305.0, false),
          screws(0.5));
  static final Instrument TRAWLER =
      instrument(
          InstrumentKind.BASS,
          "Ostwick Trawler/D-0088",
          DemoPeople.OSK,
          new Neck(4, 863.6, 863.6, 20, 254.0, false),
          screws(0.7));
  static final Instrument PARLOUR =
      instrument(
          InstrumentKind.STEEL_STRING,
          "Varrow-Dell Parlour/D-1203",
          DemoPeople.OSK,
          new Neck(6, 645.2, 645.2, 20, 406.0, false),
          new Saddle(SaddleKind.ONE_PIECE, null, ScrewSense.NOT_KNOWN, 3.2));
  static final Instrument TWELVEFOLD =
      instrument(
          InstrumentKind.ELECTRIC,
          "Brindlemoor Twelvefold/D-0077",
          DemoPeople.MIRREN,
          new Neck(12, 648, 648, 22, 305.0, true),
          screws(0.5));

  private DemoInstruments() {}

  static List<Instrument> all() {
    return List.of(LAPWING, TRAWLER, PARLOUR, TWELVEFOLD);
  }

  private static Saddle screws(double pitchMm) {
    return new Saddle(SaddleKind.SCREW, pitchMm, ScrewSense.CLOCKWISE_AWAY, null);
  }

  private static Instrument instrument(
      InstrumentKind kind,
      String makerModelSerial,
      @Nullable Customer owner,
      Neck neck,
      Saddle saddle) {
    int space = makerModelSerial.indexOf(' ');
    int slash = makerModelSerial.indexOf('/');
    String maker = makerModelSerial.substring(0, space) + " (demo)";
    String model = makerModelSerial.substring(space + 1, slash);
    String serial = makerModelSerial.substring(slash + 1);
    return new Instrument(
        DemoPeople.id("instrument " + serial),
        owner == null ? null : owner.id(),
        kind,
        maker,
        model,
        serial,
        "",
        neck,
        saddle);
  }
}
