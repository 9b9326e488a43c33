package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.moves.Aim;
import sillet.acoustics.moves.MoveTask;
import sillet.acoustics.neck.Clearances;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.TrySpread;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.stiff.EndCondition;
import sillet.acoustics.stiff.OpenTension;
import sillet.acoustics.wire.Construction;
import sillet.acoustics.wire.CoreShape;
import sillet.acoustics.wire.StringConstants;
import sillet.acoustics.wire.StringEstimate;
import sillet.acoustics.wire.StringSpec;
import sillet.acoustics.wire.WireStrength;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Tries;

/**
 * The bench's view of a string turned into that of the physics: millimetres and inches into metres.
 */
final class AcousticString {
  private static final double M_PER_MM = 1e-3;
  private static final double M_PER_INCH = LengthUnit.MM_PER_INCH * M_PER_MM;
  private static final double KG_PER_G = 1e-3;

  private AcousticString() {}

  static MoveTask task(BenchString bench, Aim aim) {
    NoteReadings readings = bench.readings();
    boolean nutFree = bench.room().nut() != NutMovable.NO;
    StringLie lie = lie(bench);
    double share = MoveTask.modelShareOf(lie.constants());
    return new MoveTask(lie, frets(readings), readings.against(), aim, nutFree, share);
  }

  /** The tension it is tuned to, N; empty where no tension gives that pitch. */
  static OptionalDouble tensionN(FittedString string) {
    double scale = string.scaleMm() * M_PER_MM;
    var tension = OpenTension.of(constants(string), scale, string.pitch().hz(), EndCondition.USUAL);
    return tension instanceof Solved<Double> solved
        ? OptionalDouble.of(solved.value())
        : OptionalDouble.empty();
  }

  /** Share of the breaking tension, 1 = it breaks; empty where no strength is known. */
  static OptionalDouble shareOfBreaking(FittedString string) {
    OptionalDouble tension = tensionN(string);
    return tension.isEmpty()
        ? OptionalDouble.empty()
        : WireStrength.shareOfBreaking(
            spec(string.make()), string.scaleMm() * M_PER_MM, tension.getAsDouble());
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

  /** A tuner that shows thousandths still reads a hand's note. */
  private static final double SMALLEST_SD_CENTS = 1e-3;

  private static double openCents(NoteReadings readings) {
    Tries open = readings.open();
    return open == null ? 0 : TrySpread.of(open.values(), 1).median();
  }

  private static List<FretReading> frets(NoteReadings readings) {
    List<FretReading> result = new ArrayList<>(readings.frets().size());
    for (Map.Entry<Integer, Tries> entry : readings.frets().entrySet()) {
      TrySpread spread = spread(entry.getValue(), readings);
      double sd = Math.hypot(spread.sd(), entry.getValue().roundingSd());
      result.add(new FretReading(entry.getKey(), spread.median(), sd));
    }
    return result;
  }

  private static StringLie lie(BenchString bench) {
    FittedString string = bench.string();
    return StringLie.nominal(
        constants(string),
        string.pitch().hz(),
        string.scaleMm() * M_PER_MM,
        clearances(bench.heights(), string.make().construction()));
  }

  private static Clearances clearances(Heights heights, Construction construction) {
    Clearances usual = Clearances.usual(construction);
    return new Clearances(
        metres(heights.action12Mm(), usual.atTwelve()),
        metres(heights.nutgap1Mm(), usual.atFirst()),
        metres(heights.reliefMm(), usual.relief()));
  }

  private static double metres(@Nullable Double mm, double otherwise) {
    return mm == null ? otherwise : mm * M_PER_MM;
  }

  private static StringConstants constants(FittedString string) {
    return StringEstimate.of(spec(string.make()), string.pitch().hz(), string.scaleMm() * M_PER_MM);
  }

  private static StringSpec spec(StringMake make) {
    // a plain string is its own core
    Optional<Double> core =
        ConstructionWords.wound(make.construction())
            ? Optional.ofNullable(make.coreIn())
            : Optional.empty();
    Double unitMass = make.unitMassGPerM();
    return new StringSpec(
        make.gaugeIn() * M_PER_INCH,
        make.construction(),
        CoreShape.ROUND,
        core.map(in -> in * M_PER_INCH).orElse(null),
        unitMass == null ? null : unitMass * KG_PER_G);
  }
}
