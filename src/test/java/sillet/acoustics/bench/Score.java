package sillet.acoustics.bench;

import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.Map;
import sillet.acoustics.virtual.Kind;

/** Tallies by row and kind of instrument. */
final class Score {
  private final Map<Row, Map<Kind, Tally>> tallies = new LinkedHashMap<>();

  Tally of(Row row, Kind kind) {
    return tallies
        .computeIfAbsent(row, unused -> new EnumMap<>(Kind.class))
        .computeIfAbsent(kind, unused -> new Tally());
  }

  /** All kinds together. */
  Tally of(Row row) {
    Tally all = new Tally();
    for (Kind kind : Kind.values()) {
      all.addAll(of(row, kind));
    }
    return all;
  }

  boolean has(Row row) {
    return tallies.containsKey(row);
  }

  void addAll(Score other) {
    other.tallies.forEach(
        (row, byKind) -> byKind.forEach((kind, one) -> of(row, kind).addAll(one)));
  }
}
