package sillet.desktop.drawing.strings;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
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

  private final SheetWords sheetWords;
  private final double dotsPerInch;
  private final PlacedCells cells = new PlacedCells();
  private final Map<Integer, Node> words = new HashMap<>();
  private final List<Balloon> balloons = new ArrayList<>();
  private final TargetGlide targets = new TargetGlide(this::requestLayout);

  private StringsPicture picture;
  private SheetShape shape = SheetShape.USUAL;
  private boolean glide = true;
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
    swap(cells.put(new CellPlace(row, neckFret), cell), cell);
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
    getChildren().removeAll(cells.nodes());
    getChildren().removeAll(words.values());
    cells.clear();
    words.clear();
    requestLayout();
  }

  /** Gives one cell the room for several tries while they are typed. */
  public void widen(int row, int neckFret) {
    cells.widen(new CellPlace(row, neckFret));
    requestLayout();
  }

  /** All cells at their usual width again. */
  public void narrow() {
    cells.narrow();
    requestLayout();
  }

  /** The sizes for the present shape and strings. */
  public SheetMeasures measures() {
    return SheetMeasures.of(shape, picture);
  }

  /** The sheet as it is laid out at the present width. */
  public SheetGeometry geometry() {
    return geometry(picture);
  }

  /** Whether each read fret of a picture has room for cells of its own at the present width. */
  public boolean cellsFit(StringsPicture other) {
    return geometry(other).cells().fit();
  }

  /** The read fret and string nearest to a point; empty beside the board. */
  public Optional<CellPlace> near(double x, double y) {
    return PlacedCells.near(geometry(), x, y);
  }

  private SheetGeometry geometry(StringsPicture shown) {
    double width = Math.max(getWidth(), em() * LEAST_WIDTH_EM);
    return new SheetGeometry(
        shown, SheetMeasures.of(shape, shown), new SheetGeometry.Frame(width, em(), dotsPerInch));
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    new StringsPainter(pen, geometry(), sheetWords).paint(targets);
  }

  @Override
  protected void layoutChildren() {
    super.layoutChildren();
    SheetGeometry sheet = geometry();
    cells.layout(sheet);
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
