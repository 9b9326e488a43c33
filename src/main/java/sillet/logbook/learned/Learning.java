package sillet.logbook.learned;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.estimate.Figure;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.logbook.moves.BenchHistory;
import sillet.logbook.moves.KnownNeck;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitRecord;

/** Tells what the readings of an instrument have taught about it. */
public final class Learning {
  private static final double MM_PER_M = 1e3;
  private static final int LAST_FRET = 24;

  /** A fret is named from where trade texts call slotting no longer good (common practice). */
  private static final double WORTH_NAMING_MM = 0.08;

  private Learning() {}

  /**
   * What has been learned up to a visit, its own passes included.
   *
   * @param record the visit
   * @param past what came before, with the moment from which it teaches
   * @return the figures; nothing while no reading counts or no string can be estimated
   */
  public static Optional<LearnedInstrument> of(VisitRecord record, InstrumentPast past) {
    VisitRecord counting = counting(record, past.learnedFrom());
    KnownNeck neck = KnownNeck.of(VisitMoves.histories(counting, past));
    NeckEstimate estimate = neck.estimate();
    Set<Integer> rounds = rounds(neck.strings());
    if (estimate == null || rounds.isEmpty()) {
      return Optional.empty();
    }
    Figure nut = estimate.nutOffset();
    return Optional.of(
        new LearnedInstrument(
            strings(neck, estimate),
            figure(new Figure(-nut.value(), nut.sd()), MM_PER_M),
            frets(neck, estimate),
            figure(estimate.figure(0, one -> one.lie().ends().fretted()), 1),
            rounds.size(),
            VisitMoves.visitsRead(counting, past),
            past.learnedFrom()));
  }

  private static VisitRecord counting(VisitRecord record, @Nullable Instant from) {
    return from == null
        ? record
        : record.withReadings(
            record.readings().stream().filter(one -> !one.at().isBefore(from)).toList());
  }

  private static List<LearnedString> strings(KnownNeck neck, NeckEstimate estimate) {
    List<LearnedString> strings = new ArrayList<>();
    for (int i = 0; i < neck.strings().size(); i++) {
      int place = neck.place(i);
      if (place >= 0) {
        BenchHistory string = neck.strings().get(i);
        strings.add(
            new LearnedString(
                string.now().string().number(),
                figure(estimate.stiffnessFactor(place), 1),
                figure(estimate.gapAtFirst(place), MM_PER_M),
                rounds(List.of(string)).size()));
      }
    }
    return strings;
  }

  private static List<LearnedFret> frets(KnownNeck neck, NeckEstimate estimate) {
    List<LearnedFret> frets = new ArrayList<>();
    for (int fret = 1; fret <= LAST_FRET; fret++) {
      LearnedFigure place = figure(estimate.fretPlace(fret), MM_PER_M);
      if (read(neck, fret) && place.differsFrom(0) && Math.abs(place.value()) >= WORTH_NAMING_MM) {
        frets.add(new LearnedFret(fret, place));
      }
    }
    return frets;
  }

  private static boolean read(KnownNeck neck, int fret) {
    return neck.strings().stream()
        .flatMap(string -> string.occasions().stream())
        .anyMatch(one -> one.string().readings().frets().containsKey(fret));
  }

  /** The rounds in which any of the strings was read. */
  private static Set<Integer> rounds(List<BenchHistory> strings) {
    Set<Integer> rounds = new TreeSet<>();
    for (BenchHistory string : strings) {
      string.occasions().stream()
          .filter(one -> !one.string().readings().frets().isEmpty())
          .forEach(one -> rounds.add(one.round()));
    }
    return rounds;
  }

  private static LearnedFigure figure(Figure figure, double perUnit) {
    double reach = Figure.NINETY_FIVE * figure.sd() * perUnit;
    double value = figure.value() * perUnit;
    return new LearnedFigure(value, value - reach, value + reach);
  }
}
