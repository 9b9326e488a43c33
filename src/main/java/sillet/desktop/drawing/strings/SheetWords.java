package sillet.desktop.drawing.strings;

/**
 * The few words on the drawing itself, handed in by the screen.
 *
 * @param strings head of the names, "String" or "Course, string"
 * @param nut over the nut
 * @param scale says the scale of the plan
 */
public record SheetWords(String strings, String nut, ScaleWords scale) {
  /** Says a scale: times life size along the strings, and across or NaN where not known. */
  @FunctionalInterface
  public interface ScaleWords {
    /** The sentence for a plan drawn at these scales. */
    String say(double along, double across);
  }
}
