package sillet.desktop.frets;

import java.time.Instant;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import sillet.acoustics.frets.BoardScale;
import sillet.acoustics.frets.FretErrors;
import sillet.acoustics.frets.FretSheet;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.parts.FretPlace;
import sillet.logbook.parts.FretPlaces;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/** A scale with its frets, and the places of those that were measured. */
final class FretSheetModel {
  static final int MOST_FRETS = 36;
  private static final double MM = 1e3;
  private static final double SHORTEST_MM = 100;
  private static final double LONGEST_MM = 2000;

  /** Against what measured frets are held. */
  enum Against {
    /** The nominal scale, from the nut as it stands. */
    NOMINAL,
    /** The scale that the frets themselves give, wherever the nut stands. */
    FRETS
  }

  private final LengthUnit unit;
  private final TypedFieldModel<Length> scale;
  private final TypedFieldModel<Integer> frets;
  private final List<TypedFieldModel<Length>> places = new ArrayList<>();
  private Optional<Against> asked = Optional.empty();
  private List<FretPlace> kept = List.of();

  FretSheetModel(LengthUnit unit, double scaleMm, int frets) {
    this.unit = unit;
    this.scale =
        TypedFieldModel.required(this::readScale, Message.of("frets.scale-missing"))
            .sayingBack(length -> length.other(unit));
    this.frets =
        TypedFieldModel.required(
            Readers.whole(1, MOST_FRETS, "frets"), Message.of("frets.count-missing"));
    for (int fret = 1; fret <= MOST_FRETS; fret++) {
      places.add(TypedFieldModel.optional(this::readPlace));
    }
    fill(scaleMm, frets);
  }

  /** Puts another board in. */
  void fill(double scaleMm, int count) {
    scale.fill(written(scaleMm));
    frets.fill(Integer.toString(count));
  }

  /** A length as the shop types it. */
  private String written(double mm) {
    return unit == LengthUnit.MM
        ? Figures.fixed(mm, 2).replaceFirst("\\.?0+$", "")
        : Figures.fixed(mm / LengthUnit.MM_PER_INCH, 3) + "in";
  }

  TypedFieldModel<Length> scale() {
    return scale;
  }

  TypedFieldModel<Integer> frets() {
    return frets;
  }

  /** Where a fret was measured, from the nut's edge; may stay blank. */
  TypedFieldModel<Length> place(int fret) {
    return places.get(fret - 1);
  }

  /** Fills in what was measured before. */
  void take(FretPlaces measured) {
    places.forEach(place -> place.fill(""));
    for (FretPlace one : measured.places()) {
      if (one.fret() >= 1 && one.fret() <= MOST_FRETS) {
        place(one.fret()).fill(one.typed());
      }
    }
    kept = measuredPlaces();
  }

  /** What was measured so far, in m by fret, as far as the board goes. */
  SortedMap<Integer, Double> metres() {
    SortedMap<Integer, Double> metres = new TreeMap<>();
    measuredPlaces().forEach(one -> metres.put(one.fret(), one.fromNutMm() / MM));
    return metres;
  }

  private List<FretPlace> measuredPlaces() {
    List<FretPlace> all = new ArrayList<>();
    int count = frets.value().orElse(0);
    for (int fret = 1; fret <= count; fret++) {
      Optional<Length> place = place(fret).value();
      if (place.isPresent()) {
        all.add(new FretPlace(fret, place.get().mm(), place.get().typed()));
      }
    }
    return all;
  }

  /** Whether something was typed that is not kept yet. */
  boolean changed() {
    return !measuredPlaces().isEmpty() && !measuredPlaces().equals(kept);
  }

  /** Judges every place; the measuring only if all can be taken and there is one. */
  Optional<FretPlaces> finish(Instant now) {
    boolean all = scale.look() && frets.look();
    for (TypedFieldModel<Length> place : places) {
      all = place.look() && all;
    }
    List<FretPlace> measured = measuredPlaces();
    return all && !measured.isEmpty()
        ? Optional.of(new FretPlaces(now, scale.value().orElseThrow().mm(), measured))
        : Optional.empty();
  }

  /** What was finished is on the disk. */
  void kept(FretPlaces measured) {
    kept = measured.places();
  }

  /** The scale by frets 1 and 13, where both were measured. */
  Optional<BoardScale> byRule() {
    return BoardScale.byFirstAndThirteenth(metres());
  }

  /** The scale by all measured frets, where there are enough. */
  Optional<BoardScale> byAll() {
    return BoardScale.byAllFrets(metres());
  }

  /** Chooses against what the frets are held. */
  void hold(Against against) {
    asked = Optional.of(against);
  }

  /** Against what they are held: their own scale where it is known, unless asked otherwise. */
  Against against() {
    boolean own = byAll().isPresent();
    return own ? asked.orElse(Against.FRETS) : Against.NOMINAL;
  }

  /** Every fret of the board; none while scale or count cannot be read. */
  List<FretRow> rows() {
    if (scale.value().isEmpty() || frets.value().isEmpty()) {
      return List.of();
    }
    double metres = scale.value().orElseThrow().mm() / MM;
    Map<Integer, FretRow.Off> off = off(metres);
    List<FretRow> rows = new ArrayList<>();
    for (FretSheet.Line line : FretSheet.of(metres, frets.value().orElseThrow()).lines()) {
      rows.add(
          new FretRow(
              line.fret(),
              line.fromNut() * MM,
              line.fromBefore() * MM,
              line.toLast() * MM,
              Optional.ofNullable(off.get(line.fret()))));
    }
    return rows;
  }

  private Map<Integer, FretRow.Off> off(double nominal) {
    SortedMap<Integer, Double> measured = metres();
    Optional<BoardScale> own = against() == Against.FRETS ? byAll() : Optional.empty();
    double longest = own.map(board -> board.scale() + board.nutFar()).orElse(nominal);
    measured.values().removeIf(place -> place >= longest);
    FretErrors errors =
        own.map(board -> board.errors(measured))
            .orElseGet(() -> FretErrors.of(nominal, 0, measured));
    Map<Integer, FretRow.Off> off = new HashMap<>();
    for (FretErrors.Line line : errors.lines()) {
      off.put(line.fret(), new FretRow.Off(line.error() * MM, line.cents()));
    }
    return off;
  }

  /** The fret that costs most; empty where none was measured. */
  Optional<FretRow> worst() {
    return rows().stream()
        .filter(row -> row.off().isPresent())
        .max((one, other) -> Double.compare(cost(one), cost(other)));
  }

  private static double cost(FretRow row) {
    return row.off().map(off -> Math.abs(off.cents())).orElse(0.0);
  }

  private Length readScale(String text) {
    Length length = Length.parse(text, unit);
    if (!(length.mm() >= SHORTEST_MM && length.mm() <= LONGEST_MM)) {
      throw Rejection.of("field.between", "100", "2000", "mm", text.strip());
    }
    return length;
  }

  private Length readPlace(String text) {
    Length length = Length.parse(text, unit);
    double longest = scale.value().map(Length::mm).orElse(LONGEST_MM);
    if (!(length.mm() > 0 && length.mm() < longest)) {
      throw Rejection.of("field.between", "0", Figures.fixed(longest, 1), "mm", text.strip());
    }
    return length;
  }
}
