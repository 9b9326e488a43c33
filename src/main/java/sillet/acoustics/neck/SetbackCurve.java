package sillet.acoustics.neck;

/** Cents of fretted notes against the open string, as a function of where saddle and nut stand. */
@FunctionalInterface
public interface SetbackCurve {

  /** Cents at a fret from 1 up; NaN where there is no such note. */
  double cents(int fret, Setbacks at);

  /** The full model of a string, fretted as usual; its own setbacks are left aside. */
  static SetbackCurve of(StringLie lie) {
    return (fret, at) ->
        FrettedPitch.centsAgainstOpen(
            lie.withSaddleSetback(at.saddle()).withNutSetback(at.nut()), fret);
  }
}
