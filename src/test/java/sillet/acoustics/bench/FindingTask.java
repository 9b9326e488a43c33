package sillet.acoustics.bench;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeSet;
import sillet.acoustics.findings.FindingOptions;
import sillet.acoustics.findings.NeckFinding;
import sillet.acoustics.findings.NeckFindings;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.virtual.Fault;
import sillet.acoustics.virtual.Luck;
import sillet.acoustics.virtual.Mishap;
import sillet.acoustics.virtual.VirtualInstrument;
import sillet.acoustics.virtual.Workshop;

/**
 * Frets 1 to 12, 15 and 17 read with 0.4 cent of scatter on an instrument that is sound and on the
 * same with one fault: whether the fault is named, and what else is.
 */
final class FindingTask implements Task {
  private static final int[] FRETS = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 15, 17};

  static final String CLEAN = "strings of sound instruments with a finding";
  static final String BESIDE = "faulty instruments: strings with a wrong finding";

  static Row row(boolean heights, String what) {
    return new Row(heights ? "findings, heights measured" : "findings, heights not measured", what);
  }

  /** What a mishap is called in the table. */
  static String name(Mishap mishap) {
    return switch (mishap) {
      case HIGH_SLOT -> "slot 0.45 mm high";
      case FAR_NUT -> "nut 0.7-1.3 mm far";
      case NEAR_NUT -> "nut 0.7-1.3 mm near";
      case FRET -> "fret 0.35-0.55 mm off";
      case SLANTED_FRET -> "fret off by that, slanted";
      case UNEVEN_STRING -> "string of 1.5 % mass ripple";
    };
  }

  @Override
  public void run(Case one, Score score) {
    VirtualInstrument sound = new Workshop(one.luck(this, 0), 0).build(one.kind());
    for (boolean heights : new boolean[] {true, false}) {
      Technician technician =
          new Technician(
              one.luck(this, heights ? 1 : 2), Technician.Habits.usual(NeckTask.SCATTER));
      Tally clean = score.of(row(heights, CLEAN), one.kind());
      Set<Integer> named = named(find(sound, technician, heights), sound.strings().size());
      for (int i = 0; i < sound.strings().size(); i++) {
        clean.ask(named.contains(i));
      }
      Luck luck = one.luck(this, 3);
      for (Mishap mishap : EnumSet.allOf(Mishap.class)) {
        Fault fault = mishap.draw(luck, sound);
        List<NeckFinding> findings = find(sound.with(fault), technician, heights);
        score
            .of(row(heights, name(mishap)), one.kind())
            .ask(findings.stream().anyMatch(finding -> names(finding, fault)));
        beside(score.of(row(heights, BESIDE), one.kind()), findings, fault, sound);
      }
    }
  }

  private static List<NeckFinding> find(
      VirtualInstrument instrument, Technician technician, boolean heights) {
    List<BenchString> strings = technician.takeIn(instrument, heights, Reference.OPEN);
    List<List<FretReading>> readings = new ArrayList<>();
    for (BenchString string : strings) {
      readings.add(technician.read(string, FRETS));
    }
    return NeckFindings.of(Solver.estimate(strings, readings), FindingOptions.NONE);
  }

  /** Strings that a wrong finding names, of all but the one at fault. */
  private static void beside(
      Tally tally, List<NeckFinding> findings, Fault fault, VirtualInstrument instrument) {
    List<NeckFinding> wrong = findings.stream().filter(finding -> !names(finding, fault)).toList();
    Set<Integer> named = named(wrong, instrument.strings().size());
    OptionalInt own = string(fault);
    for (int i = 0; i < instrument.strings().size(); i++) {
      if (own.isEmpty() || own.getAsInt() != i) {
        tally.ask(named.contains(i));
      }
    }
  }

  private static Set<Integer> named(List<NeckFinding> findings, int strings) {
    Set<Integer> named = new TreeSet<>();
    for (NeckFinding finding : findings) {
      for (int i = 0; i < strings; i++) {
        if (finding.string().orElse(i) == i) {
          named.add(i);
        }
      }
    }
    return named;
  }

  private static OptionalInt string(Fault fault) {
    if (fault instanceof Fault.HighSlot slot) {
      return OptionalInt.of(slot.string());
    }
    return fault instanceof Fault.UnevenString uneven
        ? OptionalInt.of(uneven.string())
        : OptionalInt.empty();
  }

  private static boolean names(NeckFinding finding, Fault fault) {
    return switch (finding.kind()) {
      case NUT_HIGH ->
          fault instanceof Fault.HighSlot slot && finding.string().equals(string(slot));
      case STRING ->
          fault instanceof Fault.UnevenString uneven && finding.string().equals(string(uneven));
      case NUT_FAR -> fault instanceof Fault.NutPlace nut && nut.by() > 0;
      case NUT_NEAR -> fault instanceof Fault.NutPlace nut && nut.by() < 0;
      case FRET ->
          fault instanceof Fault.FretPlace fret
              && finding.fret().equals(OptionalInt.of(fret.fret()))
              && finding.slanted() == (fret.underFirst() * fret.underLast() < 0);
      case READING, ACTION -> false;
    };
  }
}
