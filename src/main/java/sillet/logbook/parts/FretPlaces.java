package sillet.logbook.parts;

import java.time.Instant;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * The frets of an instrument as they were measured at one time.
 *
 * @param at when
 * @param scaleMm nominal scale they were held against, millimetres
 * @param places by fret, only what was measured
 */
public record FretPlaces(Instant at, double scaleMm, List<FretPlace> places) {

  /** Copies the places. */
  public FretPlaces {
    places = List.copyOf(places);
  }

  /**
   * The places as the physics takes them.
   *
   * @return metres from the nut's edge, by fret
   */
  public SortedMap<Integer, Double> metres() {
    SortedMap<Integer, Double> metres = new TreeMap<>();
    for (FretPlace place : places) {
      metres.put(place.fret(), place.fromNutMm() / 1000);
    }
    return metres;
  }
}
