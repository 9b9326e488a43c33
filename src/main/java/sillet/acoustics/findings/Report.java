package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import sillet.acoustics.findings.Evidence.Measure;
import sillet.acoustics.findings.LinearNeck.Amount;

/** Puts numbers to what was found: amount, worth, and what speaks for it. */
final class Report {
  private final NeckCurves curves;
  private final NeckCase notes;
  private final List<Suspect> all;

  Report(NeckCurves curves, NeckCase notes, List<Suspect> all) {
    this.curves = curves;
    this.notes = notes;
    this.all = all;
  }

  NeckFinding finding(Suspect suspect) {
    return switch (suspect.kind()) {
      case READING -> reading(suspect);
      case STRING -> string(suspect);
      case NUT_HIGH -> slot(suspect);
      case NUT_FAR, NUT_NEAR -> nut(suspect);
      case FRET -> suspect.slanted() ? slanted(suspect) : fret(suspect);
      case ACTION -> throw new IllegalArgumentException("action is no suspect of the readings");
    };
  }

  /** A note whose tries disagree; nothing else need be wrong with it. */
  NeckFinding disagreement(FindingOptions.Note note) {
    return new NeckFinding(
        Kind.READING,
        OptionalInt.of(note.string()),
        OptionalInt.of(note.fret()),
        false,
        0,
        0,
        0,
        List.of(new Evidence(Measure.TRIES_DISAGREE, note.fret(), 1)));
  }

  private NeckFinding reading(Suspect suspect) {
    int string = suspect.string();
    int fret = suspect.fret();
    double[] adds = curves.ofReading(fret, suspect.amount());
    double[] asRead = Worth.with(curves.cents(string), adds);
    return new NeckFinding(
        Kind.READING,
        OptionalInt.of(string),
        OptionalInt.of(fret),
        false,
        suspect.amount(),
        suspect.sd(),
        Worth.of(asRead, adds),
        List.of(
            new Evidence(Measure.CENTS_OFF, fret, suspect.amount()),
            new Evidence(Measure.CENTS_SD, fret, suspect.sd()),
            significance(suspect)));
  }

  private NeckFinding string(Suspect suspect) {
    int string = suspect.string();
    double[] strays = curves.strays(string);
    int worst = 1;
    for (int fret = 2; fret <= Worth.FRETS; fret++) {
      worst = Math.abs(strays[fret]) > Math.abs(strays[worst]) ? fret : worst;
    }
    List<Evidence> evidence = new ArrayList<>();
    evidence.add(new Evidence(Measure.TIMES_WIDER, 0, suspect.amount()));
    evidence.add(new Evidence(Measure.CENTS_OFF, worst, strays[worst]));
    evidence.add(significance(suspect));
    double swing = StringTrial.swing(notes, others(suspect), string);
    if (swing > 0) {
      evidence.add(new Evidence(Measure.MASS_SWING, 0, swing));
    }
    return new NeckFinding(
        Kind.STRING,
        OptionalInt.of(string),
        OptionalInt.empty(),
        false,
        Worth.rms(strays),
        0,
        Math.max(0, Worth.of(curves.cents(string), strays)),
        evidence);
  }

  private NeckFinding slot(Suspect suspect) {
    int string = suspect.string();
    double[] adds = curves.ofSlot(string, suspect.amount());
    double gap = curves.situation(string).lie().clearances().atFirst();
    return new NeckFinding(
        Kind.NUT_HIGH,
        OptionalInt.of(string),
        OptionalInt.empty(),
        false,
        suspect.amount(),
        suspect.sd(),
        Worth.of(curves.cents(string), adds),
        List.of(
            new Evidence(Measure.GAP, 1, gap),
            new Evidence(Measure.GAP_OF_NEIGHBOURS, 1, neighbours(string)),
            new Evidence(Measure.CENTS, 1, adds[1]),
            new Evidence(Measure.CENTS, 2, adds[2]),
            new Evidence(Measure.CENTS, 12, adds[12]),
            significance(suspect)));
  }

  /** Mean most likely clearance at fret 1 of the strings beside this one. */
  private double neighbours(int string) {
    double sum = 0;
    int count = 0;
    for (int beside = string - 1; beside <= string + 1; beside += 2) {
      if (beside >= 0 && beside < curves.strings()) {
        sum += curves.situation(beside).lie().clearances().atFirst();
        count++;
      }
    }
    return sum / count;
  }

  private NeckFinding nut(Suspect suspect) {
    double far = suspect.kind() == Kind.NUT_FAR ? suspect.amount() : -suspect.amount();
    double worth = 0;
    double cents = 0;
    for (int string = 0; string < curves.strings(); string++) {
      double[] adds = curves.ofNut(string, far);
      worth += Worth.of(curves.cents(string), adds) / curves.strings();
      cents += adds[5] / curves.strings();
    }
    return new NeckFinding(
        suspect.kind(),
        OptionalInt.empty(),
        OptionalInt.empty(),
        false,
        suspect.amount(),
        suspect.sd(),
        worth,
        List.of(new Evidence(Measure.CENTS, 0, cents), significance(suspect)));
  }

  private NeckFinding fret(Suspect suspect) {
    int fret = suspect.fret();
    LinearNeck others = others(suspect);
    double worth = 0;
    double cents = 0;
    int agreeing = 0;
    int read = 0;
    for (int string = 0; string < curves.strings(); string++) {
      double[] adds = curves.ofFret(string, fret, suspect.amount());
      worth += Worth.of(curves.cents(string), adds) / curves.strings();
      double[] shape = notes.ofString(notes.frets().get(fret), string);
      if (notes.reads(string, fret)) {
        Amount own = others.amount(shape);
        agreeing += own.value() * suspect.amount() > 0 ? 1 : 0;
        cents += meanOf(shape) * suspect.amount();
        read++;
      }
    }
    return new NeckFinding(
        Kind.FRET,
        OptionalInt.empty(),
        OptionalInt.of(fret),
        false,
        suspect.amount(),
        suspect.sd(),
        worth,
        List.of(
            new Evidence(Measure.CENTS, fret, cents / read),
            new Evidence(Measure.CENTS_BESIDE, fret, beside(others, fret)),
            new Evidence(Measure.STRINGS_AGREEING, fret, agreeing),
            new Evidence(Measure.STRINGS_READ, fret, read),
            significance(suspect)));
  }

  private NeckFinding slanted(Suspect suspect) {
    int fret = suspect.fret();
    double[] shape = notes.frets().get(fret);
    LinearNeck others = others(suspect);
    Pair pair = Pair.of(others, others.trace(shape), others.trace(notes.acrossTheBoard(shape)));
    double middle = pair.first().value();
    double half = pair.second().value();
    double worth = 0;
    for (int string = 0; string < curves.strings(); string++) {
      double place = middle + half * NeckCase.across(string, curves.strings());
      double[] adds = curves.ofFret(string, fret, place);
      worth += Worth.of(curves.cents(string), adds) / curves.strings();
    }
    return new NeckFinding(
        Kind.FRET,
        OptionalInt.empty(),
        OptionalInt.of(fret),
        true,
        middle - half,
        Math.hypot(pair.first().sd(), pair.second().sd()),
        worth,
        List.of(
            new Evidence(Measure.PLACE_AT_FIRST, fret, middle - half),
            new Evidence(Measure.PLACE_AT_LAST, fret, middle + half),
            new Evidence(Measure.CENTS, fret, meanOf(shape) * (middle - half)),
            new Evidence(Measure.CENTS_BESIDE, fret, beside(others, fret)),
            new Evidence(Measure.STRINGS_READ, fret, notes.stringsReadAt(fret)),
            significance(suspect)));
  }

  /** Mean cents by which the nearest frets read on either side are out of place. */
  private double beside(LinearNeck others, int fret) {
    double sum = 0;
    int count = 0;
    for (int step = -1; step <= 1; step += 2) {
      int next = fret + step;
      if (next >= 1 && next < notes.frets().size() && notes.stringsReadAt(next) > 0) {
        double[] shape = notes.frets().get(next);
        sum += others.amount(shape).value() * meanOf(shape);
        count++;
      }
    }
    return count == 0 ? 0 : sum / count;
  }

  private static double meanOf(double[] shape) {
    double sum = 0;
    int count = 0;
    for (double one : shape) {
      if (one != 0) {
        sum += one;
        count++;
      }
    }
    return count == 0 ? 0 : sum / count;
  }

  /** The problem with all other causes taken into account. */
  private LinearNeck others(Suspect suspect) {
    LinearNeck others = notes.linear();
    for (Suspect other : all) {
      others = other.sameAs(suspect) ? others : other.effect().in(others);
    }
    return others;
  }

  private static Evidence significance(Suspect suspect) {
    return new Evidence(Measure.SIGNIFICANCE, 0, Math.sqrt(suspect.gain()));
  }
}
