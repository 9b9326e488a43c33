package sillet.desktop.visit.readings;

import java.util.ArrayList;
import java.util.List;

/** Puts cells beside their fret lines so that none covers another. Any unit, the same for all. */
public final class CellLayout {
  private CellLayout() {}

  /**
   * Left edges of the cells: each as near to its wished place as its neighbours allow.
   *
   * @param wished where each cell would stand alone, ascending
   * @param width of a cell with the space to the next
   * @param right the edge no cell may pass, unless all of them together are wider
   */
  public static List<Double> leftEdges(List<Double> wished, double width, double right) {
    double[] left = new double[wished.size()];
    double free = Double.NEGATIVE_INFINITY;
    for (int i = 0; i < left.length; i++) {
      left[i] = Math.max(wished.get(i), free);
      free = left[i] + width;
    }
    double limit = right;
    for (int i = left.length - 1; i >= 0; i--) {
      left[i] = Math.min(left[i], limit - width);
      limit = left[i];
    }
    List<Double> edges = new ArrayList<>();
    for (double edge : left) {
      edges.add(edge);
    }
    return edges;
  }
}
