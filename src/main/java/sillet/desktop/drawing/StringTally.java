package sillet.desktop.drawing;

import java.util.List;

/** How far a visit's strings are, one small block a string, for a row of a list. */
public final class StringTally extends Glyph {
  /** What one string waits for. */
  public enum State {
    /** Nothing: the saddle stands where it should. */
    DONE,
    /** Its saddle must be moved. */
    TO_MOVE,
    UNREAD,
    /** It must be read again. */
    STALE
  }

  private static final double STEP_EM = 0.64;
  private static final double WIDTH_EM = 0.36;
  private static final double HEIGHT_EM = 1.21;

  private List<State> states;

  /** The strings from 1 on, with the same in words for screen readers. */
  public StringTally(List<State> states, String says) {
    super(says);
    this.states = List.copyOf(states);
  }

  /** Shows other states. */
  public void show(List<State> newStates, String says) {
    states = List.copyOf(newStates);
    changed(says);
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    for (int i = 0; i < states.size(); i++) {
      double x = pen.em(0.07 + i * STEP_EM);
      Box box = new Box(x, (height - pen.em(HEIGHT_EM)) / 2, pen.em(WIDTH_EM), pen.em(HEIGHT_EM));
      one(pen, states.get(i), box);
    }
  }

  private static void one(Pen pen, State state, Box box) {
    Stroke pencil = new Stroke(pen.inks().pencil(), pen.atLeast(1.5, 0.11));
    switch (state) {
      case DONE -> pen.block(pen.inks().ink(), box);
      case TO_MOVE -> pen.openBlock(pencil, pen.inks().sheet(), box);
      case UNREAD ->
          pen.level(
              box.x(),
              box.right(),
              box.bottom(),
              new Stroke(pen.inks().soft(), pen.atLeast(1, 0.1)));
      case STALE -> {
        pen.openBlock(pencil, pen.inks().sheet(), box);
        double over = pen.em(0.12);
        pen.line(box.x() - over, box.bottom(), box.right() + over, box.y(), pencil);
      }
    }
  }

  @Override
  protected double widthPx() {
    return em() * (0.14 + states.size() * STEP_EM);
  }

  @Override
  protected double heightPx() {
    return em() * 1.43;
  }
}
