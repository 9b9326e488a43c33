package sillet.acoustics.virtual;

import java.util.ArrayList;
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

  /** The same instrument with something wrong. */
  public VirtualInstrument with(Fault fault) {
    List<Course> faulty = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      Course course = strings.get(i);
      faulty.add(new Course(course.plan(), course.drawn(), spoilt(course.string(), i, fault)));
    }
    return new VirtualInstrument(kind, neck, faulty);
  }

  private VirtualString spoilt(VirtualString string, int place, Fault fault) {
    if (fault instanceof Fault.HighSlot slot) {
      return slot.string() == place ? string.withSlotHigher(slot.by()) : string;
    }
    if (fault instanceof Fault.NutPlace nut) {
      return string.withNutAway(nut.by());
    }
    if (fault instanceof Fault.FretPlace fret) {
      double across = place / (strings.size() - 1.0);
      double by = fret.underFirst() + across * (fret.underLast() - fret.underFirst());
      return string.withFretMoved(fret.fret(), by);
    }
    Fault.UnevenString uneven = (Fault.UnevenString) fault;
    return uneven.string() == place
        ? string.withRipple(new MassRipple(uneven.share(), uneven.wave(), uneven.phase()))
        : string;
  }
}
