package sillet.desktop.drawing;

import javafx.scene.AccessibleRole;
import javafx.scene.paint.Color;

/** A note such as F#3 or Bb2, drawn with a true sharp or flat. */
public final class NoteName extends Glyph {
  private static final double LINE_EM = 1.2;

  private final boolean bold;
  private Notation note;

  /** The note as typed; screen readers hear what was typed. */
  public NoteName(String typed, boolean bold) {
    super(typed);
    this.bold = bold;
    this.note = Notation.of(typed);
    setAccessibleRole(AccessibleRole.TEXT);
  }

  /** Shows another note. */
  public void show(String typed) {
    note = Notation.of(typed);
    changed(typed);
  }

  private Lettering lettering(Color colour) {
    return bold ? Lettering.bold(1, colour) : Lettering.plain(1, colour);
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    note.paint(pen, lettering(pen.inks().ink()), 0, height / 2);
  }

  @Override
  protected double widthPx() {
    return note.width(lettering(Color.BLACK), em());
  }

  @Override
  protected double heightPx() {
    return em() * LINE_EM;
  }
}
