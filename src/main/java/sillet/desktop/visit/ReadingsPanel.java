package sillet.desktop.visit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.geometry.Rectangle2D;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Pane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.ScreenDots;
import sillet.desktop.drawing.strings.Bridge;
import sillet.desktop.drawing.strings.MoveWords;
import sillet.desktop.drawing.strings.SheetShape;
import sillet.desktop.drawing.strings.SheetWords;
import sillet.desktop.drawing.strings.StringsDrawing;
import sillet.desktop.drawing.strings.StringsPicture;
import sillet.desktop.drawing.strings.WordColumns;
import sillet.desktop.drawing.strings.WordsHead;
import sillet.desktop.theme.Looks;
import sillet.desktop.visit.made.MadeRows;
import sillet.desktop.visit.picture.MoveTexts;
import sillet.desktop.visit.picture.VisitPicture;
import sillet.desktop.visit.readings.Cell;
import sillet.desktop.visit.readings.CentsCallout;
import sillet.desktop.visit.words.FindingLine;
import sillet.desktop.visit.words.StringWords;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** The drawing with its cells and words: where one reads, and what the readings ask for. */
final class ReadingsPanel extends VBox {
  private final VisitModel model;
  private final Texts texts;
  private final StringsDrawing drawing;
  private final CellsOnSheet cells;
  private final VisitHand hand;
  private final SheetHead head;
  private final HBox title = new HBox();
  private final HBox actions = new HBox();
  private final CentsCallout callout;
  private final StackPane sheet = new StackPane();
  private final List<MoveWords> words = new ArrayList<>();
  private final WordsOfVisit said;
  private @Nullable MadeRows made;
  private SheetShape shape = SheetShape.USUAL;
  private boolean turned;
  private List<FindingLine> findings = List.of();

  ReadingsPanel(VisitDesk desk, WordsOfVisit said, Runnable changed) {
    this.model = desk.model();
    this.texts = desk.texts();
    this.said = said;
    this.hand = new VisitHand(desk, this::focus, changed);
    SheetWords sheetWords =
        new SheetWords(texts.say("visit.sheet.string"), texts.say("visit.sheet.nut"), this::scale);
    this.drawing = new StringsDrawing(picture(), sheetWords, ScreenDots.perInch());
    this.cells = new CellsOnSheet(drawing, texts);
    this.callout = new CentsCallout(texts.say("visit.grid.example"));
    title.getStyleClass().add("sheet-title");
    title.setAlignment(Pos.CENTER_LEFT);
    actions.getStyleClass().add("sheet-actions");
    this.head = new SheetHead(drawing, texts, title, actions);
    Pane above = new Pane(callout);
    above.setMouseTransparent(true);
    above.setPickOnBounds(false);
    sheet.getChildren().addAll(drawing, above);
    getStyleClass().addAll(Looks.PANEL, "readings");
    getChildren().addAll(head, sheet);
    makeCells();
  }

  private String scale(double along, double across) {
    String factor = Figures.fixed(along, 1).replaceFirst("\\.0$", "");
    return Double.isNaN(across)
        ? texts.say("visit.sheet.along", factor)
        : texts.say("visit.sheet.along-across", factor, Figures.fixed(across, 1));
  }

  private StringsPicture picture() {
    return new VisitPicture(
            model.record().instrument(), model.passes(), model.pass(), model.frets().frets(), texts)
        .make(findings, turned);
  }

  /** Makes the cells anew: other frets or another pass. */
  void makeCells() {
    drawing.clearPlaced();
    words.clear();
    drawing.show(picture());
    cells.make(
        model.record().visit().strings().strings(),
        model.frets().frets(),
        model.record().instrument().neck(),
        hand);
    cells.editable(model.open());
    placeWords();
  }

  private void placeWords() {
    words.clear();
    WordColumns columns = WordColumns.of(shape, drawing.picture());
    MoveTexts set = new MoveTexts(texts, drawing.picture(), shape);
    for (StringWords string : said.of(model)) {
      MoveWords node = new MoveWords(set.of(string), columns);
      words.add(node);
      drawing.setWords(string.string() - 1, node);
    }
    drawing.setWordsHead(wordsHead(columns));
  }

  private Node wordsHead(WordColumns columns) {
    return switch (columns.line()) {
      case ONE ->
          new WordsHead(
              texts.say("visit.words.turns"),
              texts.say("visit.words.mm"),
              texts.say("visit.words.left-head"),
              columns);
      case PLACE ->
          new WordsHead(
              texts.say("visit.words.file"), "", texts.say("visit.words.from-front"), columns);
      case TWO ->
          shape == SheetShape.NARROW
              ? new WordsHead(
                  texts.say("visit.words.turns"), "", texts.say("visit.words.left-mm"), columns)
              : new WordsHead(said.sense(model), "", "", columns);
    };
  }

  /** Takes the shape that goes with the width of the window. */
  void setShape(SheetShape wanted) {
    if (wanted != shape) {
      shape = wanted;
      drawing.setShape(wanted);
      if (made == null) {
        placeWords();
      }
    }
  }

  /** Shows the readings and what they ask for as they now are. */
  void refresh(List<FindingLine> nowFound, List<StringWords> strings) {
    findings = nowFound;
    drawing.show(picture());
    cells.refresh();
    if (made == null) {
      WordColumns columns = WordColumns.of(shape, drawing.picture());
      MoveTexts set = new MoveTexts(texts, drawing.picture(), shape);
      for (int row = 0; row < words.size(); row++) {
        words.get(row).show(set.of(strings.get(row)), columns);
      }
    }
    showCallout();
    showHead();
  }

  private void showHead() {
    boolean onePiece = drawing.picture().bridge() instanceof Bridge.OnePiece;
    boolean predicted =
        drawing.picture().rows().stream()
            .flatMap(row -> row.frets().stream())
            .anyMatch(mark -> mark.predicted() != null);
    String moveHead = made == null ? texts.say("visit.words.head") : "";
    head.show(onePiece, model.pass(), predicted, moveHead);
  }

  private void showCallout() {
    Optional<Cell> wrong = cells.wrong(hand);
    callout.setVisible(wrong.isPresent());
    wrong.ifPresent(this::showCallout);
  }

  private void showCallout(Cell cell) {
    var problem = hand.face(cell).problem();
    if (problem == null) {
      return;
    }
    callout.say(texts.say(problem));
    Rectangle2D at = drawing.cellInScene(cell.string() - 1, cells.neckFret(cell));
    var middle = sheet.sceneToLocal(at.getMaxX(), (at.getMinY() + at.getMaxY()) / 2);
    callout.applyCss();
    callout.relocate(middle.getX(), Math.rint(middle.getY() - callout.prefHeight(-1) / 2));
  }

  /** What stands left in the head. */
  void title(Node... nodes) {
    Label name = new Label(texts.say("visit.readings"));
    name.getStyleClass().add(Looks.PANEL_HEAD);
    title.getChildren().setAll(name);
    title.getChildren().addAll(nodes);
    head.requestLayout();
  }

  /** What can be done, right in the head. */
  void actions(Button... buttons) {
    if (!actions.getChildren().equals(List.of(buttons))) {
      actions.getChildren().setAll(buttons);
      head.requestLayout();
    }
  }

  /** Puts the rows for the moves made in the place of the words, or the words back. */
  void showMade(@Nullable MadeRows rows) {
    made = rows;
    if (rows == null) {
      placeWords();
      return;
    }
    List<Node> nodes = rows.nodes();
    for (int row = 0; row < nodes.size(); row++) {
      drawing.setWords(row, nodes.get(row));
    }
    Label how = new Label(texts.say("visit.made.how"));
    how.getStyleClass().add(Looks.NOTE);
    drawing.setWordsHead(how);
  }

  /** Turns head and foot of the instrument about. */
  void turnAbout() {
    turned = !turned;
    drawing.show(picture());
    if (made == null) {
      placeWords();
    }
    showHead();
  }

  void focus(Cell cell) {
    cells.focus(cell);
  }

  /** Whether nothing is typed any more. */
  void editable(boolean open) {
    cells.editable(open);
  }

  /** Px of one em. */
  double em() {
    return drawing.em();
  }
}
