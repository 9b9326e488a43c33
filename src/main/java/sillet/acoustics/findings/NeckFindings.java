package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalInt;
import sillet.acoustics.estimate.NeckEstimate;

/**
 * What a saddle cannot cure, from the readings along the neck.
 *
 * <p>Every cause is a hypothesis tried against all readings at once while everything that is not
 * known of the instrument adjusts itself (generalised likelihood ratio on the estimate's linear
 * problem). A cause is named when it is both significant and large enough to matter; strongest
 * first, each then taken into account, so that several do not hide each other. A single reading at
 * fret 12 names none but disagreeing tries.
 */
public final class NeckFindings {
  private NeckFindings() {}

  /**
   * The causes that stand out.
   *
   * @param estimate of the instrument
   * @param options targets and disagreeing tries
   * @return in the order to look; none on a sound instrument
   */
  public static List<NeckFinding> of(NeckEstimate estimate, FindingOptions options) {
    if (estimate.misfits().isEmpty()) {
      return List.of();
    }
    List<NeckFinding> findings = new ArrayList<>();
    NeckCase notes = NeckCases.of(estimate);
    NeckCurves curves = new NeckCurves(estimate, notes);
    List<Suspect> suspects = Search.of(notes);
    Report report = new Report(curves, notes, suspects);
    suspects.forEach(suspect -> findings.add(report.finding(suspect)));
    for (FindingOptions.Note note : options.disagreements()) {
      if (findings.stream().noneMatch(finding -> isReadingOf(finding, note))) {
        findings.add(report.disagreement(note));
      }
    }
    options
        .targetActions()
        .forEach(
            (string, target) ->
                ActionTrial.of(estimate, curves, string, target).ifPresent(findings::add));
    findings.sort(
        Comparator.comparing(NeckFinding::kind)
            .thenComparing(finding -> -finding.worthCents())
            .thenComparing(finding -> finding.string().orElse(-1))
            .thenComparing(finding -> finding.fret().orElse(-1)));
    return List.copyOf(findings);
  }

  private static boolean isReadingOf(NeckFinding finding, FindingOptions.Note note) {
    return finding.kind() == Kind.READING
        && finding.string().equals(OptionalInt.of(note.string()))
        && finding.fret().equals(OptionalInt.of(note.fret()));
  }
}
