package sillet.desktop.drawing;

import javafx.scene.AccessibleRole;

/** A small drawing of fixed size that stands in a line of words; the mouse passes through it. */
public abstract class Glyph extends Drawn {
  /** A glyph with its meaning in words, for screen readers. */
  protected Glyph(String says) {
    setAccessibleRole(AccessibleRole.IMAGE_VIEW);
    setAccessibleText(says);
    setMouseTransparent(true);
  }

  /** Width in px at the present em. */
  protected abstract double widthPx();

  /** Height in px at the present em. */
  protected abstract double heightPx();

  /** Takes the new state in words and draws anew. */
  protected final void changed(String says) {
    setAccessibleText(says);
    requestLayout();
  }

  @Override
  protected final double computePrefWidth(double height) {
    return Math.ceil(widthPx());
  }

  @Override
  protected final double computePrefHeight(double width) {
    return Math.ceil(heightPx());
  }

  @Override
  protected final double computeMinWidth(double height) {
    return computePrefWidth(height);
  }

  @Override
  protected final double computeMinHeight(double width) {
    return computePrefHeight(width);
  }
}
