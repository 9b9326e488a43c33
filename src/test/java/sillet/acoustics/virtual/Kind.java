package sillet.acoustics.virtual;

import static sillet.acoustics.virtual.StringPlan.Construct.PLAIN_NYLON;
import static sillet.acoustics.virtual.StringPlan.Construct.PLAIN_STEEL;
import static sillet.acoustics.virtual.StringPlan.Construct.WOUND_BRONZE;
import static sillet.acoustics.virtual.StringPlan.Construct.WOUND_NICKEL;
import static sillet.acoustics.virtual.StringPlan.Construct.WOUND_NYLON;
import static sillet.acoustics.virtual.StringPlan.Construct.WOUND_STEEL;

import java.util.List;

/** Kinds of instrument. Gauges, core shares and heights: common practice, no source. */
public enum Kind {
  ELECTRIC,
  ACOUSTIC,
  BASS,
  NYLON,
  MANDOLIN;

  /** From least to most, millimetres. */
  record Range(double least, double most) {}

  /** How a kind is built and set up. */
  record Ranges(Range scale, Range actionAtTwelve, Range gapAtFirst, Range relief) {}

  Ranges ranges() {
    return switch (this) {
      case ELECTRIC ->
          new Ranges(
              new Range(625, 650), new Range(1.3, 2.2), new Range(.25, .55), new Range(.05, .35));
      case ACOUSTIC ->
          new Ranges(
              new Range(630, 652), new Range(1.7, 2.9), new Range(.3, .6), new Range(.05, .3));
      case BASS ->
          new Ranges(
              new Range(762, 889), new Range(1.7, 2.9), new Range(.4, .65), new Range(.15, .45));
      case NYLON ->
          new Ranges(
              new Range(635, 662), new Range(2.9, 4.2), new Range(.5, .9), new Range(0, .15));
      case MANDOLIN ->
          new Ranges(
              new Range(345, 358), new Range(1.3, 2.0), new Range(.25, .5), new Range(0, .12));
    };
  }

  /** One standard deviation of the core's share in the diameter. */
  double coreScatter() {
    return this == BASS ? 0.18 : 0.12;
  }

  /** Whether the bridge stands on a thin top that resounds. */
  boolean soundboard() {
    return this == ACOUSTIC || this == NYLON || this == MANDOLIN;
  }

  /** The set it is strung with, each gauge times a factor, rounded to half a thousandth. */
  List<StringPlan> strings(double gaugeFactor, int semitonesLower) {
    return strings().stream().map(plan -> plan.changed(gaugeFactor, semitonesLower)).toList();
  }

  /** The set it is strung with, from the treble side. */
  List<StringPlan> strings() {
    return switch (this) {
      case ELECTRIC ->
          List.of(
              StringPlan.of(-5, .010, PLAIN_STEEL, 1),
              StringPlan.of(-10, .013, PLAIN_STEEL, 1),
              StringPlan.of(-14, .017, PLAIN_STEEL, 1),
              StringPlan.of(-19, .026, WOUND_NICKEL, 0.56),
              StringPlan.of(-24, .036, WOUND_STEEL, 0.44),
              StringPlan.of(-29, .046, WOUND_NICKEL, 0.39));
      case ACOUSTIC ->
          List.of(
              StringPlan.of(-5, .012, PLAIN_STEEL, 1),
              StringPlan.of(-10, .016, PLAIN_STEEL, 1),
              StringPlan.of(-14, .024, WOUND_BRONZE, 0.58),
              StringPlan.of(-19, .032, WOUND_BRONZE, 0.46),
              StringPlan.of(-24, .042, WOUND_BRONZE, 0.40),
              StringPlan.of(-29, .053, WOUND_BRONZE, 0.355));
      case BASS ->
          List.of(
              StringPlan.of(-26, .045, WOUND_STEEL, 0.41),
              StringPlan.of(-31, .065, WOUND_STEEL, 0.33),
              StringPlan.of(-36, .085, WOUND_NICKEL, 0.28),
              StringPlan.of(-41, .105, WOUND_NICKEL, 0.25),
              StringPlan.of(-46, .130, WOUND_STEEL, 0.22));
      case NYLON ->
          List.of(
              StringPlan.of(-5, .028, PLAIN_NYLON, 1),
              StringPlan.of(-10, .032, PLAIN_NYLON, 1),
              StringPlan.of(-14, .040, PLAIN_NYLON, 1),
              StringPlan.of(-19, .029, WOUND_NYLON, 1),
              StringPlan.of(-24, .035, WOUND_NYLON, 1),
              StringPlan.of(-29, .043, WOUND_NYLON, 1));
      case MANDOLIN ->
          List.of(
              StringPlan.of(7, .011, PLAIN_STEEL, 1),
              StringPlan.of(7, .011, PLAIN_STEEL, 1),
              StringPlan.of(0, .015, PLAIN_STEEL, 1),
              StringPlan.of(0, .015, PLAIN_STEEL, 1),
              StringPlan.of(-7, .024, WOUND_BRONZE, 0.53),
              StringPlan.of(-7, .024, WOUND_BRONZE, 0.53),
              StringPlan.of(-14, .040, WOUND_BRONZE, 0.40),
              StringPlan.of(-14, .040, WOUND_BRONZE, 0.40));
    };
  }
}
