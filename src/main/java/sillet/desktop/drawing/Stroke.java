package sillet.desktop.drawing;

import java.util.Arrays;
import java.util.List;
import javafx.scene.paint.Color;

/**
 * How a line is drawn.
 *
 * @param colour its colour
 * @param width px
 * @param dashes px on, px off, and so on; empty for a solid line
 */
public record Stroke(Color colour, double width, List<Double> dashes) {
  public Stroke {
    dashes = List.copyOf(dashes);
  }

  /** A solid line. */
  public Stroke(Color colour, double width) {
    this(colour, width, List.of());
  }

  /** The same line, broken: px on, px off, and so on. */
  public Stroke broken(double... onAndOff) {
    return new Stroke(colour, width, Arrays.stream(onAndOff).boxed().toList());
  }
}
