package sillet.desktop.drawing.strings;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import javafx.geometry.Rectangle2D;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.Balloon;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Drawn;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Snap;

/**
 * The main drawing as a node. It draws a {@link StringsPicture} and sets the nodes of the screen in
 * their places: a cell for each string and read fret, words for each string.
 */
public final class StringsDrawing extends Drawn {
  private static final double LEAST_WIDTH_EM = 50;

  /** Room for three tries, in type sizes of a figure. */
  private static final double WIDENED_FIGURES = 8.2;

  private record Place(int row, int fret) {}

  private final SheetWords sheetWords;
  private final double dotsPerInch;
  private final Map<Place, Node> cells = new HashMap<>();
  private final Map<Integer, Node> words = new HashMap<>();
  private final List<Balloon> balloons = new ArrayList<>();
  private final TargetGlide targets = new TargetGlide(this::requestLayout);

  private StringsPicture picture;
  private SheetShape shape = SheetShape.USUAL;
  private boolean glide = true;
  private @Nullable Place widened;
  private @Nullable Node wordsHead;

  /**
   * A drawing of a picture.
   *
   * @param picture what it shows first
   * @param words the few words on it
   * @param dotsPerInch px of an inch on this screen
   */
  public StringsDrawing(StringsPicture picture, SheetWords words, double dotsPerInch) {
    this.picture = picture;
    this.sheetWords = words;
    this.dotsPerInch = dotsPerInch;
    setAccessibleRole(AccessibleRole.PARENT);
    show(picture);
  }

  /** Shows another state of the same instrument, or another one. Cells and words stay placed. */
  public void show(StringsPicture newPicture) {
    picture = newPicture;
    targets.retarget(newPicture, glide && getScene() != null);
    getChildren().removeAll(balloons);
    balloons.clear();
    for (FindingMark finding : newPicture.findings()) {
      balloons.add(new Balloon(finding.number(), false, finding.says()));
    }
    getChildren().addAll(balloons);
    requestLayout();
  }

  public StringsPicture picture() {
    return picture;
  }

  /** Takes the shape that goes with the width of the window. */
  public void setShape(SheetShape newShape) {
    shape = newShape;
    requestLayout();
  }

  /** Whether a saddle target glides to a new place; a setting of the shop. */
  public void setGlide(boolean wanted) {
    glide = wanted;
  }

  /**
   * Puts a cell where a string's reading at a read fret belongs. The drawing sets its size and, as
   * its inline style, its type size.
   */
  public void setCell(int row, int neckFret, Node cell) {
    swap(cells.put(new Place(row, neckFret), cell), cell);
  }

  /** Puts words, most often {@link MoveWords}, at the end of a string. */
  public void setWords(int row, Node node) {
    swap(words.put(row, node), node);
  }

  /** Puts a line of heads above the words. */
  public void setWordsHead(Node node) {
    swap(wordsHead, node);
    wordsHead = node;
  }

  private void swap(@Nullable Node before, Node after) {
    if (before != null) {
      getChildren().remove(before);
    }
    after.setManaged(false);
    getChildren().add(after);
    requestLayout();
  }

  /** Takes all cells and words away, before another instrument is shown. */
  public void clearPlaced() {
    getChildren().removeAll(cells.values());
    getChildren().removeAll(words.values());
    cells.clear();
    words.clear();
    widened = null;
    requestLayout();
  }

  /** Gives one cell the room for several tries while they are typed. */
  public void widen(int row, int neckFret) {
    widened = new Place(row, neckFret);
    Node cell = cells.get(widened);
    if (cell != null) {
      cell.toFront();
    }
    requestLayout();
  }

  /** All cells at their usual width again. */
  public void narrow() {
    widened = null;
    requestLayout();
  }

  /** The sizes for the present shape and strings. */
  public SheetMeasures measures() {
    return SheetMeasures.of(shape, picture);
  }

  /** The sheet as it is laid out at the present width. */
  public SheetGeometry geometry() {
    double width = Math.max(getWidth(), em() * LEAST_WIDTH_EM);
    return new SheetGeometry(
        picture, measures(), new SheetGeometry.Frame(width, em(), dotsPerInch));
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    new StringsPainter(pen, geometry(), sheetWords).paint(targets);
  }

  @Override
  protected void layoutChildren() {
    super.layoutChildren();
    SheetGeometry sheet = geometry();
    cells.forEach((place, cell) -> layoutCell(sheet, place, cell));
    words.forEach((row, node) -> put(node, sheet.words(row)));
    if (wordsHead != null) {
      put(wordsHead, sheet.wordsHead());
    }
    for (int i = 0; i < balloons.size(); i++) {
      FindingLeader leader = FindingLeader.of(sheet, picture.findings().get(i));
      double size = balloons.get(i).prefWidth(-1);
      put(balloons.get(i), Box.around(leader.x(), leader.y(), size, size));
    }
  }

  private void layoutCell(SheetGeometry sheet, Place place, Node cell) {
    boolean there =
        place.row() < picture.rows().size() && picture.board().readFrets().contains(place.fret());
    cell.setVisible(there);
    if (!there) {
      return;
    }
    Box box = sheet.cells().cell(place.row(), place.fret());
    String style = String.format(Locale.ROOT, "-fx-font-size: %.2fpx;", sheet.cells().figurePx());
    if (!style.equals(cell.getStyle())) {
      cell.setStyle(style);
      cell.applyCss();
    }
    put(cell, place.equals(widened) ? widenedBox(sheet, box) : box);
  }

  private Box widenedBox(SheetGeometry sheet, Box box) {
    double width = Math.max(box.width(), Snap.px(sheet.cells().figurePx() * WIDENED_FIGURES));
    double x = sheet.away() > 0 ? box.x() : box.right() - width;
    double over = sheet.away() > 0 ? Math.max(0, x + width - sheet.boardEnd()) : 0;
    double under = sheet.away() < 0 ? Math.max(0, sheet.boardEnd() - x) : 0;
    return new Box(x - over + under, box.y(), width, box.height());
  }

  private static void put(Node node, Box box) {
    node.resizeRelocate(Snap.px(box.x()), Snap.px(box.y()), box.width(), box.height());
  }

  /** Where a cell stands, in the scene, for what hangs on it. */
  public Rectangle2D cellInScene(int row, int neckFret) {
    Box box = geometry().cells().cell(row, neckFret);
    var corner = localToScene(box.x(), box.y());
    return new Rectangle2D(corner.getX(), corner.getY(), box.width(), box.height());
  }

  @Override
  protected double computePrefWidth(double height) {
    return computeMinWidth(height);
  }

  @Override
  protected double computeMinWidth(double height) {
    return em() * LEAST_WIDTH_EM;
  }

  @Override
  protected double computePrefHeight(double width) {
    return SheetGeometry.heightPx(picture, measures(), em());
  }

  @Override
  protected double computeMinHeight(double width) {
    return computePrefHeight(width);
  }
}
