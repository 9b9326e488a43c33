package sillet.logbook.moves;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.OptionalInt;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.findings.FindingOptions;
import sillet.acoustics.findings.Kind;
import sillet.acoustics.findings.NeckFinding;
import sillet.acoustics.findings.NeckFindings;
import sillet.logbook.text.Message;

/** The findings of an instrument for people, in the order in which to look. */
public final class InstrumentFindings {
  private InstrumentFindings() {}

  /**
   * What stands out.
   *
   * @param neck an estimated instrument
   * @return causes that a saddle cannot cure; empty for a sound instrument
   */
  public static List<FindingReport> of(KnownNeck neck) {
    List<BenchHistory> now = neck.strings().stream().map(BenchHistory::ofNow).toList();
    return found(now.equals(neck.strings()) ? neck : KnownNeck.of(now));
  }

  private static List<FindingReport> found(KnownNeck neck) {
    Map<FindingOptions.Note, Message> odd = new HashMap<>();
    List<FindingReport> reports = new ArrayList<>();
    for (int i = 0; i < neck.strings().size(); i++) {
      BenchString string = neck.strings().get(i).now();
      for (Disagreements.Odd one : Disagreements.of(string)) {
        if (neck.place(i) < 0) {
          reports.add(oddTries(string.string().number(), one));
        } else {
          odd.put(new FindingOptions.Note(neck.place(i), one.fret()), one.said());
        }
      }
    }
    NeckEstimate estimate = neck.estimate();
    if (estimate != null && !severalFrets(neck)) {
      odd.keySet().stream()
          .sorted(Comparator.comparingInt(FindingOptions.Note::string))
          .map(note -> oddTries(neck.number(note.string()), odd(note, odd)))
          .forEach(reports::add);
    } else if (estimate != null) {
      FindingOptions options = new FindingOptions(Map.of(), odd.keySet());
      for (NeckFinding found : NeckFindings.of(estimate, options)) {
        reports.add(report(found, neck, odd));
      }
    }
    return reports;
  }

  /** One fret a string names no cause, whatever it reads; that is most of what comes to a bench. */
  private static boolean severalFrets(KnownNeck neck) {
    return neck.strings().stream()
        .flatMap(string -> string.occasions().stream())
        .anyMatch(one -> one.string().readings().frets().size() > 1);
  }

  /** Tries that disagree explain a reading better than its distance from the others. */
  private static FindingReport report(
      NeckFinding found, KnownNeck neck, Map<FindingOptions.Note, Message> odd) {
    OptionalInt string = found.string();
    OptionalInt fret = found.fret();
    if (found.kind() == Kind.READING && string.isPresent() && fret.isPresent()) {
      int place = string.getAsInt();
      FindingOptions.Note note = new FindingOptions.Note(place, fret.getAsInt());
      if (odd.containsKey(note)) {
        return oddTries(neck.number(place), odd(note, odd));
      }
    }
    return new FindingWords(found, neck).report();
  }

  private static Disagreements.Odd odd(
      FindingOptions.Note note, Map<FindingOptions.Note, Message> odd) {
    return new Disagreements.Odd(note.fret(), Objects.requireNonNull(odd.get(note)));
  }

  private static FindingReport oddTries(int number, Disagreements.Odd odd) {
    Message again = Message.of("finding.reading.do");
    return new FindingReport(
        Finding.READING, number, odd.fret(), false, 0, odd.said(), again, null);
  }
}
