package sillet.desktop.drawing.strings;

/** The shapes of the drawing. They go by the width of the window in em, not by its pixels. */
public enum SheetShape {
  /** 56 to 79 em: a laptop at 150 %. */
  NARROW,
  /** 80 to 119 em: a laptop. */
  USUAL,
  /** From 120 em: a bench screen. */
  WIDE;

  /** The shape for a window so many em wide. */
  public static SheetShape forWindow(double widthEm) {
    if (widthEm >= 120) {
      return WIDE;
    }
    return widthEm >= 80 ? USUAL : NARROW;
  }
}
