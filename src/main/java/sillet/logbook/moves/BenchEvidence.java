package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.HeightSds;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.Occasion;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.TrySpread;
import sillet.acoustics.wire.Construction;
import sillet.logbook.strings.FittedString;
import sillet.logbook.units.Tries;

/** The bench's view of an instrument turned into evidence for the physics. */
final class BenchEvidence {
  /** A tuner that shows thousandths still reads a hand's note. */
  private static final double SMALLEST_SD_CENTS = 1e-3;

  /** Between measured strings, each with a slot and a groove of its own (chosen; no source), m. */
  private static final HeightSds BETWEEN =
      new HeightSds(1.5e-4, 6e-5, HeightSds.measured().relief());

  private BenchEvidence() {}

  static InstrumentEvidence of(List<BenchHistory> strings) {
    return new InstrumentEvidence(strings.stream().map(BenchEvidence::history).toList());
  }

  private static StringHistory history(BenchHistory history) {
    return new StringHistory(history.occasions().stream().map(BenchEvidence::occasion).toList());
  }

  private static Occasion occasion(BenchOccasion occasion) {
    BenchString string = occasion.string();
    Double moved = occasion.saddleMovedMm();
    return new Occasion(
        occasion.round(),
        occasion.wire(),
        lie(string),
        sds(string.heights(), string.string().make().construction()),
        moved == null ? OptionalDouble.empty() : OptionalDouble.of(moved * AcousticString.M_PER_MM),
        occasion.nutMovedMm() * AcousticString.M_PER_MM,
        string.readings().against(),
        frets(string.readings()));
  }

  /** The tries of a note taken together, less what the open string itself read. */
  static TrySpread spread(Tries tries, NoteReadings readings) {
    double[] cents = tries.values();
    double open = openCents(readings);
    for (int i = 0; i < cents.length; i++) {
      cents[i] -= open;
    }
    return TrySpread.of(cents, Math.max(readings.sdCents(), SMALLEST_SD_CENTS));
  }

  private static double openCents(NoteReadings readings) {
    Tries open = readings.open();
    return open == null ? 0 : TrySpread.of(open.values(), 1).median();
  }

  /** One note as it counts. */
  static NoteRead read(Tries tries, NoteReadings readings) {
    TrySpread spread = spread(tries, readings);
    return new NoteRead(spread.median(), Math.hypot(spread.sd(), tries.roundingSd()));
  }

  private static List<FretReading> frets(NoteReadings readings) {
    List<FretReading> result = new ArrayList<>(readings.frets().size());
    readings
        .frets()
        .forEach(
            (fret, tries) -> {
              NoteRead read = read(tries, readings);
              result.add(new FretReading(fret, read.cents(), read.sdCents()));
            });
    return result;
  }

  private static StringLie lie(BenchString bench) {
    FittedString string = bench.string();
    return StringLie.nominal(
        AcousticString.constants(string),
        string.pitch().hz(),
        AcousticString.scale(string),
        clearances(bench.heights(), string.make().construction()));
  }

  private static Clearances clearances(Heights heights, Construction construction) {
    Clearances usual = Clearances.usual(construction);
    return new Clearances(
        metres(heights.action12Mm(), usual.atTwelve()),
        metres(heights.nutgap1Mm(), usual.atFirst()),
        metres(heights.reliefMm(), usual.relief()));
  }

  private static HeightSds sds(Heights heights, Construction construction) {
    HeightSds measured = heights.between() ? BETWEEN : HeightSds.measured();
    HeightSds unknown = HeightSds.unknown(construction);
    return new HeightSds(
        heights.action12Mm() == null ? unknown.atTwelve() : measured.atTwelve(),
        heights.nutgap1Mm() == null ? unknown.atFirst() : measured.atFirst(),
        heights.reliefMm() == null ? unknown.relief() : measured.relief());
  }

  private static double metres(@Nullable Double mm, double otherwise) {
    return mm == null ? otherwise : mm * AcousticString.M_PER_MM;
  }
}
