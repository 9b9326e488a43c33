package sillet.acoustics.bench;

import java.io.PrintStream;
import java.util.Locale;
import java.util.StringJoiner;
import java.util.function.Function;
import sillet.acoustics.virtual.Kind;

/** Lines of the table: task, figure, bar, met or not. Rows nothing was counted for are left out. */
final class Printout {
  private static final String LINE = "%-32s %-84s %7s  %-9s %s%n";

  private final PrintStream out;
  private final Score score;

  Printout(PrintStream out, Score score) {
    this.out = out;
    this.score = score;
  }

  void head() {
    out.printf(Locale.ROOT, LINE, "task", "figure", "value", "bar", "met");
  }

  void octave(Row row, boolean judged) {
    left(row, judged, 0.10, 0.30);
  }

  void forecast(Row row, boolean judged) {
    left(row, judged, 1.0, 4.0);
  }

  private void left(Row row, boolean judged, double median, double ninetyFifth) {
    if (!score.has(row)) {
      return;
    }
    Tally all = score.of(row);
    line(row, "median left, cents", all.median(), judged ? median : Double.NaN);
    line(row, "95th percentile, cents", all.ninetyFifth(), judged ? ninetyFifth : Double.NaN);
    coverage(row, judged);
  }

  void neck(Row row, double bar) {
    if (!score.has(row)) {
      return;
    }
    Tally all = score.of(row);
    line(row, "mean rms after/at best", all.ratio(), bar);
    print(row, families(kind -> number("%.3f", score.of(row, kind).ratio())), "", "", "");
    if (all.intervals() > 0) {
      coverage(row, !Double.isNaN(bar));
    }
  }

  void coverage(Row row, boolean judged) {
    Tally all = score.of(row);
    double share = 100 * all.coverage();
    String met = judged ? yes(share >= 93 && share <= 98) : "";
    print(row, "95 % interval holds, %", number("%.1f", share), judged ? "93-98" : "", met);
    boolean within = true;
    for (Kind kind : Kind.values()) {
      double own = 100 * score.of(row, kind).coverage();
      within &= own >= 90 && own <= 99;
    }
    String families = families(kind -> number("%.1f", 100 * score.of(row, kind).coverage()));
    print(row, families, "", judged ? "90-99" : "", judged ? yes(within) : "");
  }

  private static String families(Function<Kind, String> figure) {
    StringJoiner families = new StringJoiner(" ");
    for (Kind kind : Kind.values()) {
      families.add(kind.name().toLowerCase(Locale.ROOT) + " " + figure.apply(kind));
    }
    return families.toString();
  }

  void line(Row row, String figure, double value, double atMost) {
    boolean judged = !Double.isNaN(atMost);
    String bar = judged ? "<= " + atMost : "";
    print(row, figure, number("%.3f", value), bar, judged ? yes(value <= atMost) : "");
  }

  /** A share in per cent and the least or most it may be. */
  void share(Row row, String figure, double bar, boolean atLeast) {
    if (!score.has(row)) {
      return;
    }
    double value = 100 * score.of(row).share();
    boolean met = atLeast ? value >= bar : value <= bar;
    boolean judged = !Double.isNaN(bar);
    String sign = atLeast ? ">= " : "<= ";
    print(
        row,
        figure,
        number("%.1f", value),
        judged ? sign + number("%.0f", bar) : "",
        judged ? yes(met) : "");
    print(row, families(kind -> number("%.1f", 100 * score.of(row, kind).share())), "", "", "");
  }

  private void print(Row row, String figure, String value, String bar, String met) {
    out.printf(Locale.ROOT, LINE, row.task(), row.way() + ": " + figure, value, bar, met);
  }

  private static String number(String format, double value) {
    return String.format(Locale.ROOT, format, value);
  }

  private static String yes(boolean met) {
    return met ? "yes" : "NO";
  }
}
