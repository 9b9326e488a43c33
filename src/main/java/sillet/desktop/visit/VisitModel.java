package sillet.desktop.visit;

import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import sillet.desktop.visit.readings.Cell;
import sillet.desktop.visit.readings.GridModel;
import sillet.desktop.visit.readings.GridWalk;
import sillet.desktop.visit.readings.ReadingTerms;
import sillet.desktop.visit.readings.ShownFrets;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.ChooseAim;
import sillet.logbook.actions.RecordReadings;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.Reading;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.VisitAim;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitPass;
import sillet.logbook.visits.VisitRecord;

/**
 * One visit as its page knows it: the record, what is typed above it, which pass is looked at, and
 * what all that asks for. Reckons anew at each key, which costs well under a millisecond for an
 * instrument.
 */
public final class VisitModel {
  private final MoveAdvisor advisor;
  private final InstrumentPast past;
  private final Clock clock;
  private final Map<Integer, GridModel> grids = new TreeMap<>();
  private VisitRecord record;
  private ReadingTerms terms;
  private ShownFrets frets;
  private int pass;
  private List<VisitPass> passes = List.of();
  private @Nullable VisitAim chosen;

  /** A visit of an instrument of which earlier visits may have taught something. */
  public VisitModel(VisitRecord record, InstrumentPast past, MoveAdvisor advisor, Clock clock) {
    this.record = record;
    this.past = past;
    this.advisor = advisor;
    this.clock = clock;
    this.terms = ReadingTerms.lastOf(record.readings());
    this.frets = ShownFrets.including(fretsRead(record));
    reckon();
    this.pass = passes.size();
  }

  private static Set<Integer> fretsRead(VisitRecord record) {
    Set<Integer> read = new TreeSet<>();
    record.readings().forEach(reading -> read.add(reading.fret()));
    return read;
  }

  /** Takes what the logbook now holds; drafts stay. */
  public void take(VisitRecord now) {
    int lastBefore = lastPass();
    record = now;
    if (now.aim().equals(chosen)) {
      chosen = null;
    }
    grids.values().forEach(grid -> grid.take(now.readings()));
    reckon();
    if (lastPass() > lastBefore) {
      pass = lastPass();
    }
  }

  private void reckon() {
    List<Reading> all = new ArrayList<>(record.readings());
    grids.values().forEach(grid -> all.addAll(grid.drafts(clock.instant())));
    passes = VisitMoves.passes(withReadings(all), past, advisor);
  }

  private VisitRecord withReadings(List<Reading> readings) {
    return new VisitRecord(
        record.visit(),
        record.instrument(),
        record.customer(),
        record.checks(),
        readings,
        record.moves(),
        record.work(),
        record.notes(),
        aim());
  }

  public VisitRecord record() {
    return record;
  }

  public UUID visitId() {
    return record.visit().id();
  }

  /** True while the instrument is in the shop; after that nothing is typed any more. */
  public boolean open() {
    return record.visit().handedOut() == null;
  }

  /** The pass that is looked at, from 1. */
  public int pass() {
    return pass;
  }

  /** The newest pass. */
  public int lastPass() {
    return passes.size();
  }

  /** Looks at another pass. */
  public void look(int atPass) {
    pass = Math.max(1, Math.min(lastPass(), atPass));
  }

  /** Every pass, in each the strings in order. */
  public List<List<StringPass>> passes() {
    return passes.stream().map(VisitPass::strings).toList();
  }

  /** The strings in the pass that is looked at, string 1 first. */
  public List<StringPass> strings() {
    return now().strings();
  }

  /** The pass that is looked at, with what was found over all strings. */
  public VisitPass now() {
    return passes.get(pass - 1);
  }

  /** What shall become true, and whether the nut can move. */
  public VisitAim aim() {
    return chosen == null ? record.aim() : chosen;
  }

  /** Reckons for another aim; the action that saves it. */
  public Action aimAt(VisitAim wanted) {
    chosen = wanted;
    reckon();
    return new ChooseAim(visitId(), wanted);
  }

  /** The strings in the pass before, empty in the first. */
  public List<StringPass> before() {
    return pass > 1 ? passes.get(pass - 2).strings() : List.of();
  }

  /** The readings of the pass that is looked at. */
  public GridModel grid() {
    return gridOf(pass);
  }

  /** The readings of any pass. */
  public GridModel gridOf(int ofPass) {
    return grids.computeIfAbsent(
        ofPass,
        wanted -> {
          GridModel grid = new GridModel(wanted, terms);
          grid.take(record.readings());
          return grid;
        });
  }

  public ReadingTerms terms() {
    return terms;
  }

  /** Changes how the readings from now on are taken. */
  public void readUnder(ReadingTerms changed) {
    terms = changed;
    grids.values().forEach(grid -> grid.readUnder(changed));
    reckon();
  }

  public ShownFrets frets() {
    return frets;
  }

  /** Shows cells at other frets; what was read elsewhere stays in the record. */
  public void show(ShownFrets chosen) {
    frets = chosen;
  }

  public GridWalk walk() {
    return new GridWalk(record.visit().strings().strings().size(), frets.frets());
  }

  /** Takes what now stands in a cell. */
  public void type(Cell cell, String text) {
    grid().type(cell, text);
    reckon();
  }

  /** Moves the last try of a cell by tenths of a cent. */
  public void step(Cell cell, int tenths) {
    grid().step(cell, tenths);
    reckon();
  }

  /** The action that saves a cell, once; empty if there is nothing new or it cannot be read. */
  public Optional<Action> commit(Cell cell) {
    return grid()
        .send(cell, clock.instant())
        .map(reading -> new RecordReadings(visitId(), List.of(reading)));
  }

  /** True while a cell of any pass holds what the record does not. */
  public boolean draft() {
    return grids.values().stream().anyMatch(GridModel::draft);
  }
}
