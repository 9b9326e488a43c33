package sillet.acoustics.virtual;

import java.util.List;

/**
 * An instrument on the bench.
 *
 * @param kind what it is
 * @param neck shared by all strings
 * @param strings from the treble side
 */
public record VirtualInstrument(Kind kind, VirtualNeck neck, List<Course> strings) {
  /**
   * A string and what only its maker knows.
   *
   * @param plan what the packet says
   * @param drawn what the wire is
   * @param string to be asked for its pitch
   */
  public record Course(StringPlan plan, WireMill.Drawn drawn, VirtualString string) {}
}
