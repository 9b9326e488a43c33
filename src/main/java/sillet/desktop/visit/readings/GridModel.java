package sillet.desktop.visit.readings;

import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import sillet.logbook.units.Tries;
import sillet.logbook.visits.Reading;

/**
 * The readings of one pass: what the record holds and, above it, what was typed and is not yet part
 * of it. Typing never changes the record; a cell that is committed asks for a reading to be saved,
 * and what was typed stays until the record holds it.
 */
public final class GridModel {
  private final int pass;
  private final Map<Cell, Reading> recorded = new LinkedHashMap<>();
  private final Map<Cell, CellText> typed = new LinkedHashMap<>();
  private final Map<Cell, CellText> sent = new LinkedHashMap<>();
  private ReadingTerms terms;

  public GridModel(int pass, ReadingTerms terms) {
    this.pass = pass;
    this.terms = terms;
  }

  public int pass() {
    return pass;
  }

  public ReadingTerms terms() {
    return terms;
  }

  /** Changes how the readings from now on are taken. */
  public void readUnder(ReadingTerms changed) {
    terms = changed;
  }

  /** Takes what the record now holds; what was typed and has arrived there is no draft any more. */
  public void take(List<Reading> readings) {
    recorded.clear();
    for (Reading reading : readings) {
      if (reading.pass() == pass) {
        recorded.put(new Cell(reading.string(), reading.fret()), reading);
      }
    }
    sent.entrySet().removeIf(entry -> sameAsRecorded(entry.getKey(), entry.getValue()));
    typed.entrySet().removeIf(entry -> arrived(entry.getKey(), entry.getValue()));
  }

  private boolean arrived(Cell cell, CellText entry) {
    return sameAsRecorded(cell, entry) && !sent.containsKey(cell);
  }

  private boolean sameAsRecorded(Cell cell, CellText entry) {
    return entry.problem() == null && equal(entry.tries(), recordedTries(cell));
  }

  private static boolean equal(@Nullable Tries one, @Nullable Tries other) {
    return one == null ? other == null : one.equals(other);
  }

  private @Nullable Tries recordedTries(Cell cell) {
    Reading reading = recorded.get(cell);
    return reading == null ? null : reading.tries();
  }

  /** Takes what now stands in a cell. */
  public void type(Cell cell, String text) {
    typed.put(cell, CellText.of(text));
  }

  /** Moves the last try of a cell by tenths of a cent. */
  public void step(Cell cell, int tenths) {
    type(cell, entry(cell).stepped(tenths));
  }

  /** What stands in a cell: typed, or else recorded. */
  public CellText entry(Cell cell) {
    CellText entry = typed.get(cell);
    if (entry != null) {
      return entry;
    }
    Tries tries = recordedTries(cell);
    return tries == null ? CellText.of("") : new CellText(CellText.asTyped(tries), tries, null);
  }

  /** What a cell shows. */
  public CellFace face(Cell cell) {
    Reading reading = recorded.get(cell);
    double sd = typed.containsKey(cell) || reading == null ? terms.sdCents() : reading.sdCents();
    return CellFace.of(entry(cell), sd);
  }

  /** True if a cell holds something that can be read. */
  public boolean read(Cell cell) {
    return entry(cell).tries() != null;
  }

  /**
   * What must be saved for a cell: the reading typed in it, or that an earlier one is taken back;
   * empty if there is nothing new or it cannot be read.
   */
  public Optional<Reading> toSave(Cell cell, Instant at) {
    CellText entry = typed.get(cell);
    if (entry == null || entry.problem() != null || arrived(cell, entry)) {
      return Optional.empty();
    }
    return Optional.of(reading(cell, entry.tries(), at));
  }

  /** The same, once: what is on its way to the record is not sent again. */
  public Optional<Reading> send(Cell cell, Instant at) {
    CellText entry = typed.get(cell);
    CellText before = sent.get(cell);
    boolean underWay = before != null && entry != null && equal(before.tries(), entry.tries());
    if (underWay) {
      return Optional.empty();
    }
    Optional<Reading> reading = toSave(cell, at);
    if (reading.isPresent() && entry != null) {
      sent.put(cell, entry);
    }
    return reading;
  }

  private Reading reading(Cell cell, @Nullable Tries tries, Instant at) {
    return new Reading(
        pass, cell.string(), cell.fret(), tries, terms.against(), terms.sdCents(), at);
  }

  /** The typed readings that can be read and the record does not hold yet. */
  public List<Reading> drafts(Instant at) {
    List<Reading> drafts = new ArrayList<>();
    for (Cell cell : typed.keySet()) {
      toSave(cell, at).ifPresent(drafts::add);
    }
    return drafts;
  }

  /** True while a cell holds what the record does not. */
  public boolean draft() {
    return typed.entrySet().stream().anyMatch(entry -> !arrived(entry.getKey(), entry.getValue()));
  }

  /** Frets at which anything stands, read or typed. */
  public Set<Integer> fretsRead() {
    Set<Integer> frets = new TreeSet<>();
    recorded.forEach(
        (cell, reading) -> {
          if (reading.tries() != null) {
            frets.add(cell.fret());
          }
        });
    typed.forEach(
        (cell, entry) -> {
          if (entry.filled()) {
            frets.add(cell.fret());
          }
        });
    return frets;
  }
}
