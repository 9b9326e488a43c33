package sillet.desktop.drawing;

import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.shape.StrokeLineJoin;

/**
 * Draws lines, blocks and figures so that they stay crisp: thin upright and level lines stand on
 * the middle of a pixel, blocks on its edges. All coordinates in px.
 */
public final class Pen {
  /** Lines thinner than this blur to grey unless they stand on half pixels. */
  public static final double THIN_PX = 1.7;

  /** Height of a capital or figure, as a share of the type size. */
  public static final double CAP_HEIGHT = 0.75;

  private final GraphicsContext context;
  private final Inks inks;
  private final double em;
  private final double pixelsPerUnit;

  Pen(GraphicsContext context, Inks inks, double em, double pixelsPerUnit) {
    this.context = context;
    this.inks = inks;
    this.em = em;
    this.pixelsPerUnit = pixelsPerUnit;
    context.setTextBaseline(VPos.BASELINE);
    context.setLineCap(StrokeLineCap.BUTT);
    context.setLineJoin(StrokeLineJoin.MITER);
  }

  public Inks inks() {
    return inks;
  }

  /** Px of so many em. */
  public double em(double count) {
    return count * em;
  }

  /** A line width in px: so many em, but never under a least width. */
  public double atLeast(double leastPx, double em) {
    return Math.max(leastPx, em(em));
  }

  /** The nearest pixel edge. */
  public double edge(double at) {
    return Snap.px(at * pixelsPerUnit) / pixelsPerUnit;
  }

  /** The nearest middle of a pixel. */
  public double middle(double at) {
    return (Math.floor(at * pixelsPerUnit) + 0.5) / pixelsPerUnit;
  }

  private void take(Stroke stroke) {
    context.setStroke(stroke.colour());
    context.setLineWidth(stroke.width());
    context.setLineDashes(stroke.dashes().stream().mapToDouble(Double::doubleValue).toArray());
  }

  private double crisp(double at, double width) {
    return Snap.px(width * pixelsPerUnit) % 2 == 1 ? middle(at) : edge(at);
  }

  /** A level line; widths under {@link #THIN_PX} are drawn one pixel wide or as given, crisp. */
  public void level(double fromX, double toX, double y, Stroke stroke) {
    double at = crisp(y, stroke.width());
    line(fromX, at, toX, at, stroke);
  }

  /** An upright line. */
  public void upright(double x, double fromY, double toY, Stroke stroke) {
    double at = crisp(x, stroke.width());
    line(at, fromY, at, toY, stroke);
  }

  /** A line as it comes, for slants. */
  public void line(double fromX, double fromY, double toX, double toY, Stroke stroke) {
    take(stroke);
    context.strokeLine(fromX, fromY, toX, toY);
  }

  /** A line through the points x0, y0, x1, y1 and so on. */
  public void path(Stroke stroke, double... points) {
    take(stroke);
    trace(points);
    context.stroke();
  }

  /** A closed line through the given corners. */
  public void outlined(Stroke stroke, double... points) {
    take(stroke);
    trace(points);
    context.closePath();
    context.stroke();
  }

  /** A filled area with the given corners. */
  public void area(Color fill, double... points) {
    context.setFill(fill);
    trace(points);
    context.closePath();
    context.fill();
  }

  private void trace(double... points) {
    context.beginPath();
    context.moveTo(points[0], points[1]);
    for (int i = 2; i < points.length; i += 2) {
      context.lineTo(points[i], points[i + 1]);
    }
  }

  /** A full block, its edges on pixel edges, never thinner than a pixel. */
  public void block(Color fill, Box box) {
    context.setFill(fill);
    double x = edge(box.x());
    double y = edge(box.y());
    double least = 1 / pixelsPerUnit;
    context.fillRect(
        x, y, Math.max(least, edge(box.right()) - x), Math.max(least, edge(box.bottom()) - y));
  }

  /** An open block: its stroke lies inside the box, its ground covers what lies under it. */
  public void openBlock(Stroke stroke, Color ground, Box box) {
    block(ground, box);
    double x = edge(box.x());
    double y = edge(box.y());
    double half = stroke.width() / 2;
    take(stroke);
    context.strokeRect(
        x + half,
        y + half,
        edge(box.right()) - x - stroke.width(),
        edge(box.bottom()) - y - stroke.width());
  }

  /** A box outline with slightly rounded corners, one pixel wide. */
  public void outline(Color colour, Box box, double radius) {
    take(new Stroke(colour, 1 / pixelsPerUnit));
    double x = middle(box.x());
    double y = middle(box.y());
    context.strokeRoundRect(
        x, y, middle(box.right()) - x, middle(box.bottom()) - y, 2 * radius, 2 * radius);
  }

  public void dot(Color fill, double x, double y, double radius) {
    context.setFill(fill);
    context.fillOval(x - radius, y - radius, 2 * radius, 2 * radius);
  }

  /** A ring; the radius is that of the middle of its stroke. */
  public void ring(Stroke stroke, double x, double y, double radius) {
    take(stroke);
    context.strokeOval(x - radius, y - radius, 2 * radius, 2 * radius);
  }

  /** One line of text. The point is on the baseline. */
  public void text(String text, Lettering type, double x, double baseline) {
    double share =
        switch (type.alignment()) {
          case RIGHT -> 1;
          case CENTER -> 0.5;
          default -> 0;
        };
    double from = share == 0 ? x : x - share * type.width(text, em);
    context.setFont(type.font(em));
    context.setFill(type.colour());
    context.fillText(text, edge(from), edge(baseline));
  }

  /** One line of text whose capitals and figures stand level with the given height. */
  public void textAround(String text, Lettering type, double x, double middleY) {
    text(text, type, x, middleY + em(type.sizeEm()) * CAP_HEIGHT / 2);
  }
}
