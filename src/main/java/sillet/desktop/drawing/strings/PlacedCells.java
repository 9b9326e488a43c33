package sillet.desktop.drawing.strings;

import java.util.Collection;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import javafx.scene.Node;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Snap;

/** The cells of a drawing: which are open, where they stand, and which one has more room. */
final class PlacedCells {
  /** Room for three tries, in type sizes of a figure. */
  private static final double WIDENED_FIGURES = 8.2;

  private final Map<CellPlace, Node> cells = new HashMap<>();
  private @Nullable CellPlace widened;

  /** Puts a cell in its place; gives back the one that stood there. */
  @Nullable Node put(CellPlace place, Node cell) {
    return cells.put(place, cell);
  }

  Collection<Node> nodes() {
    return List.copyOf(cells.values());
  }

  void clear() {
    cells.clear();
    widened = null;
  }

  void widen(CellPlace place) {
    widened = place;
    Node cell = cells.get(place);
    if (cell != null) {
      cell.toFront();
    }
  }

  void narrow() {
    widened = null;
  }

  void layout(SheetGeometry sheet) {
    cells.forEach((place, cell) -> layout(sheet, place, cell));
  }

  private void layout(SheetGeometry sheet, CellPlace place, Node cell) {
    cell.setVisible(open(sheet.picture(), place));
    if (!cell.isVisible()) {
      return;
    }
    Box box = sheet.cells().cell(place.row(), place.neckFret());
    String style = String.format(Locale.ROOT, "-fx-font-size: %.2fpx;", sheet.cells().figurePx());
    if (!style.equals(cell.getStyle())) {
      cell.setStyle(style);
      cell.applyCss();
    }
    Box taken = place.equals(widened) ? widened(sheet, box) : box;
    cell.resizeRelocate(Snap.px(taken.x()), Snap.px(taken.y()), taken.width(), taken.height());
  }

  private static boolean open(StringsPicture picture, CellPlace place) {
    if (place.row() >= picture.rows().size()) {
      return false;
    }
    StringsPicture.Column column = picture.board().column();
    return column == null
        ? picture.board().readFrets().contains(place.neckFret())
        : column.fret() + picture.rows().get(place.row()).startFret() == place.neckFret();
  }

  private static Box widened(SheetGeometry sheet, Box box) {
    double width = Math.max(box.width(), Snap.px(sheet.cells().figurePx() * WIDENED_FIGURES));
    double x = sheet.away() > 0 ? box.x() : box.right() - width;
    double end = sheet.boardEnd();
    if (sheet.column()) {
      end = sheet.away() > 0 ? box.right() : box.x();
    }
    double over = sheet.away() > 0 ? Math.max(0, x + width - end) : 0;
    double under = sheet.away() < 0 ? Math.max(0, end - x) : 0;
    return new Box(x - over + under, box.y(), width, box.height());
  }

  /** The read fret and string nearest to a point; empty beside the board. */
  static Optional<CellPlace> near(SheetGeometry sheet, double x, double y) {
    List<Integer> frets = sheet.picture().board().readFrets();
    return IntStream.range(0, sheet.rows().count())
        .filter(row -> Math.abs(sheet.rows().y(row) - y) < sheet.rows().rowPx() / 2)
        .boxed()
        .flatMap(row -> frets.stream().map(fret -> new CellPlace(row, fret)))
        .filter(place -> aside(sheet, place, x) < sheet.em())
        .min(Comparator.comparingDouble(place -> aside(sheet, place, x)));
  }

  private static double aside(SheetGeometry sheet, CellPlace place, double x) {
    return Math.abs(sheet.strip().neckFretX(place.row(), place.neckFret()) - x);
  }
}
