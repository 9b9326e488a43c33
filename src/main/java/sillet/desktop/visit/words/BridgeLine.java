package sillet.desktop.visit.words;

import java.util.ArrayList;
import java.util.DoubleSummaryStatistics;
import java.util.List;
import sillet.desktop.visit.readings.CentsText;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.moves.BridgeAdvice;
import sillet.logbook.moves.Direction;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/**
 * A saddle or bridge in one piece in words: where its two ends go, and what stays on each string.
 *
 * @param head its name
 * @param ends where the straight line goes
 * @param columns a column a string
 * @param sentences whether the points fit a saddle, and what else is to be known
 */
public record BridgeLine(String head, String ends, List<Column> columns, List<String> sentences) {
  /** Bone left standing at each edge, millimetres; a shop figure (common practice, no source). */
  private static final double KEPT_MM = 0.4;

  /** The usual thicknesses, 3/32 and 1/8 inch. */
  private static final double THIN_MM = 2.38;

  private static final double THICK_MM = 3.18;
  private static final int MM_DECIMALS = 2;

  /**
   * One string.
   *
   * @param number of the string
   * @param stays cents at fret 12 with the straight line
   * @param fromFront its own best break point from the front edge; empty where not known
   * @param fits whether that lies on the saddle; empty where not known
   */
  public record Column(String number, String stays, String fromFront, String fits) {}

  public BridgeLine {
    columns = List.copyOf(columns);
    sentences = List.copyOf(sentences);
  }

  /** The words for an advice. */
  public static BridgeLine of(BridgeAdvice advice, SaddleKind kind, Texts texts) {
    boolean onePiece = kind == SaddleKind.ONE_PIECE;
    List<String> sentences = new ArrayList<>();
    if (onePiece) {
      sentences.add(thickness(advice, texts));
    }
    advice.notes().forEach(note -> sentences.add(texts.say(note)));
    String ends =
        texts.say("visit.bridge.ends", way(advice.trebleMm(), texts), way(advice.bassMm(), texts));
    return new BridgeLine(
        onePiece ? texts.say("visit.bridge.saddle") : texts.say("visit.bridge.bridge"),
        ends,
        advice.left().stream().map(left -> column(left, texts)).toList(),
        sentences);
  }

  private static Column column(BridgeAdvice.StringLeft left, Texts texts) {
    Double point = left.fromFrontMm();
    Boolean fits = left.fits();
    String said =
        fits == null ? "" : fits ? texts.say("visit.bridge.yes") : texts.say("visit.bridge.no");
    return new Column(
        Integer.toString(left.string()),
        CentsText.of(left.cents12()),
        point == null ? "" : Figures.fixed(point, MM_DECIMALS),
        said);
  }

  private static String way(double mm, Texts texts) {
    String size = Figures.fixed(Math.abs(mm), MM_DECIMALS);
    Direction direction = mm > 0 ? Direction.AWAY : Direction.TOWARD;
    return texts.say("visit.bridge.way", size, texts.say(direction.key()));
  }

  private static String thickness(BridgeAdvice advice, Texts texts) {
    DoubleSummaryStatistics points = new DoubleSummaryStatistics();
    for (BridgeAdvice.StringLeft left : advice.left()) {
      Double point = left.fromFrontMm();
      if (point == null) {
        return texts.say("visit.bridge.measure");
      }
      points.accept(point);
    }
    double spread = points.getMax() - points.getMin();
    double needed = spread + 2 * KEPT_MM;
    String says = Figures.fixed(spread, 1);
    String needs = Figures.fixed(needed, 1);
    if (needed <= THIN_MM) {
      return texts.say("visit.bridge.thin", says, needs);
    }
    return needed <= THICK_MM
        ? texts.say("visit.bridge.thick", says, needs)
        : texts.say("visit.bridge.none", says, needs);
  }
}
