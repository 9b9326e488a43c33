package sillet.acoustics.tables;

import java.util.Map;

/** One line of a table of reference values, its cells by the names of the columns. */
public record Row(String name, Map<String, String> cells) {

  public String text(String column) {
    String cell = cells.get(column);
    if (cell == null) {
      throw new IllegalArgumentException("no column " + column + " in " + cells.keySet());
    }
    return cell;
  }

  public double number(String column) {
    return Double.parseDouble(text(column));
  }

  public double[] numbers(String... columns) {
    double[] values = new double[columns.length];
    for (int i = 0; i < columns.length; i++) {
      values[i] = number(columns[i]);
    }
    return values;
  }

  public boolean has(String column) {
    return !text(column).isEmpty();
  }

  /** What a report of the tests shows. */
  @Override
  public String toString() {
    return name;
  }
}
