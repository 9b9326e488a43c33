package sillet.desktop.visit.words;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.Finding;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.VisitPass;

/**
 * Collects what stands below the drawing: the causes in the order in which to look, then every note
 * of the strings that is more than the move itself. The same sentence for several strings is said
 * once.
 */
public final class FindingLines {
  private static final Set<String> CUT_SHORT =
      Set.of("move.no-room-away", "move.no-room-toward", "move.slot-away", "move.slot-toward");

  /** Said once as a finding, not twice. */
  private static final Set<String> OF_A_READING = Set.of("move.wild-try", "move.not-as-predicted");

  private final Texts texts;
  private final MoveAdvisor advisor;
  private final ReportLines reports;

  public FindingLines(Texts texts, MoveAdvisor advisor) {
    this.texts = texts;
    this.advisor = advisor;
    this.reports = new ReportLines(texts);
  }

  /** The findings of a pass. */
  public List<FindingLine> of(VisitPass pass) {
    List<FindingLine> lines = new ArrayList<>();
    pass.findings().forEach(report -> lines.add(reports.line(report)));
    lines.addAll(noted(pass));
    return lines;
  }

  private List<FindingLine> noted(VisitPass pass) {
    Map<Message, List<Integer>> found = new LinkedHashMap<>();
    for (StringPass string : pass.strings()) {
      boolean doubted = doubted(pass, string.string().string().number());
      for (Message note : notes(string)) {
        if (head(note) != null && !(doubted && OF_A_READING.contains(note.key()))) {
          found
              .computeIfAbsent(note, first -> new ArrayList<>())
              .add(string.string().string().number());
        }
      }
    }
    List<FindingLine> lines = new ArrayList<>();
    found.forEach((note, numbers) -> lines.add(line(note, numbers)));
    return lines;
  }

  private static boolean doubted(VisitPass pass, int string) {
    return pass.findings().stream()
        .anyMatch(report -> report.kind() == Finding.READING && report.concerns(string));
  }

  /** What the advice says; the strain is said of every string, read or not, in every pass. */
  private Set<Message> notes(StringPass string) {
    MoveAdvice advice = string.advice();
    Set<Message> notes = new LinkedHashSet<>(advice == null ? List.of() : advice.notes());
    Message strain = advisor.strain(string.string());
    if (strain != null) {
      notes.add(strain);
    }
    return notes;
  }

  private FindingLine line(Message note, List<Integer> numbers) {
    String list = numbers.stream().map(n -> Integer.toString(n)).collect(Collectors.joining(", "));
    String head = head(note);
    String named =
        numbers.size() == 1
            ? texts.say("visit.findings.string", head == null ? "" : head, list)
            : texts.say("visit.findings.strings", head == null ? "" : head, list);
    FindingSpot.Part part =
        CUT_SHORT.contains(note.key()) ? FindingSpot.Part.SADDLE : FindingSpot.Part.NOTE;
    return FindingLine.said(numbers, FindingSpot.at(part), named, texts.say(note));
  }

  /** The name of a finding; null for the sentence of the move itself, which stands beside it. */
  private @Nullable String head(Message note) {
    return switch (note.key()) {
      case "move.wild-try" -> texts.say("visit.findings.wild-try");
      case "move.not-as-predicted" -> texts.say("visit.findings.not-as-predicted");
      case "move.no-room-away", "move.no-room-toward" -> texts.say("visit.findings.no-room");
      case "move.slot-away", "move.slot-toward" -> texts.say("visit.findings.slot");
      case "move.unread", "move.unread-octave" -> texts.say("visit.findings.unread-octave");
      case "move.suspect-string" -> texts.say("visit.findings.suspect-string");
      case "move.not-solved" -> texts.say("visit.findings.not-solved");
      case "move.strain" -> texts.say("visit.findings.strain");
      default -> null;
    };
  }
}
