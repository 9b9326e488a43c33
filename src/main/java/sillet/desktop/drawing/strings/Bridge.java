package sillet.desktop.drawing.strings;

/** What stands at the end of the strings. */
public sealed interface Bridge {
  /**
   * A saddle for each string, measured from the nominal scale line.
   *
   * @param nominal what the zero of the rule is called, the scale in figures: {@code 648.0}
   */
  record SingleSaddles(String nominal) implements Bridge {}

  /**
   * One saddle under all strings, drawn straight, measured from its front edge.
   *
   * @param widthMm front edge to back edge
   * @param front the word before the zero of the rule
   * @param width the width in figures, for the end of the rule
   */
  record OnePiece(double widthMm, String front, String width) implements Bridge {}
}
