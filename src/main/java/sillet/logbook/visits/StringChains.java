package sillet.logbook.visits;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.BenchHistory;
import sillet.logbook.moves.BenchOccasion;
import sillet.logbook.moves.BenchString;
import sillet.logbook.strings.FittedString;

/**
 * Every reading of an instrument chained for each string, visit after visit, pass after pass: known
 * moves stand between the passes of a visit, nothing is known between visits. Readings from before
 * learning was reset are left out.
 */
final class StringChains {
  /** Scales that differ by more are of another neck. */
  private static final double SAME_SCALE_MM = 0.5;

  private final List<VisitStrings> earlier;
  private final @Nullable Instant learnedFrom;
  private final VisitStrings visit;

  /** Where the chain of one string has come to. */
  private record Link(BenchOccasion occasion, VisitStrings visit, int pass) {}

  StringChains(InstrumentPast past, VisitRecord record) {
    this.earlier = past.earlier().stream().map(VisitStrings::new).toList();
    this.learnedFrom = past.learnedFrom();
    this.visit = new VisitStrings(record);
  }

  VisitStrings visit() {
    return visit;
  }

  /** What is known at a pass of the visit, string 1 first. */
  List<BenchHistory> upTo(int pass) {
    Map<Integer, List<Link>> chains = new TreeMap<>();
    int round = 0;
    for (VisitStrings one : earlier) {
      for (int of = 1; of <= one.lastPass(); of++) {
        round++;
        if (counts(one, of)) {
          read(chains, one, of, round);
        }
      }
    }
    for (int of = 1; of < pass; of++) {
      round++;
      if (counts(visit, of)) {
        read(chains, visit, of, round);
      }
    }
    List<BenchHistory> histories = new ArrayList<>();
    for (BenchString string : visit.in(pass)) {
      List<Link> chain = chains.computeIfAbsent(string.string().number(), n -> new ArrayList<>());
      chain.add(link(chain, string, visit, pass, round + 1));
      histories.add(new BenchHistory(chain.stream().map(Link::occasion).toList()));
    }
    return histories;
  }

  /** Visits with a reading that counts, the one that is reckoned among them. */
  int visitsRead() {
    long before =
        earlier.stream()
            .filter(
                one ->
                    IntStream.rangeClosed(1, one.lastPass())
                        .anyMatch(pass -> read(one, pass) && counts(one, pass)))
            .count();
    boolean now = IntStream.rangeClosed(1, visit.lastPass()).anyMatch(pass -> read(visit, pass));
    return (int) before + (now ? 1 : 0);
  }

  private static boolean read(VisitStrings one, int pass) {
    return one.record().readings().stream().anyMatch(r -> r.pass() == pass && r.tries() != null);
  }

  private boolean counts(VisitStrings one, int pass) {
    Instant from = learnedFrom;
    return from == null
        || one.record().readings().stream()
            .anyMatch(r -> r.pass() == pass && !r.at().isBefore(from));
  }

  private void read(Map<Integer, List<Link>> chains, VisitStrings one, int pass, int round) {
    for (BenchString string : one.in(pass)) {
      if (!string.readings().frets().isEmpty() && sameNeck(string.string())) {
        List<Link> chain = chains.computeIfAbsent(string.string().number(), n -> new ArrayList<>());
        chain.add(link(chain, string, one, pass, round));
      }
    }
  }

  private boolean sameNeck(FittedString then) {
    return visit.record().visit().strings().strings().stream()
        .anyMatch(
            now ->
                now.number() == then.number()
                    && Math.abs(now.scaleMm() - then.scaleMm()) <= SAME_SCALE_MM);
  }

  private static Link link(
      List<Link> chain, BenchString string, VisitStrings visit, int pass, int round) {
    if (chain.isEmpty()) {
      return new Link(new BenchOccasion(string, round, 1, null, 0), visit, pass);
    }
    Link last = chain.get(chain.size() - 1);
    int number = string.string().number();
    boolean here = last.visit().equals(visit);
    int wire = last.occasion().wire() + (sameWire(last, string, visit) ? 0 : 1);
    double made = visit.movedMm(number, last.pass(), pass);
    boolean known = here && !SlippedSaddle.is(last.occasion().string(), string, made);
    Double moved = known ? Double.valueOf(made) : null;
    double nut =
        here
            ? visit.nutMovedMm(number, last.pass(), pass)
            : last.visit().nutMovedMm(number, last.pass(), Integer.MAX_VALUE);
    return new Link(new BenchOccasion(string, round, wire, moved, nut), visit, pass);
  }

  /** Within a visit, and between visits where the set went on the same day, it is the same wire. */
  private static boolean sameWire(Link last, BenchString string, VisitStrings visit) {
    if (last.visit().equals(visit)) {
      return true;
    }
    StringsOn then = last.visit().record().visit().strings();
    StringsOn now = visit.record().visit().strings();
    return now.fittedOn() != null
        && now.fittedOn().equals(then.fittedOn())
        && last.occasion().string().string().make().equals(string.string().make());
  }
}
