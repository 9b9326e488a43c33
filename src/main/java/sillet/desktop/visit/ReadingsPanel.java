package sillet.desktop.visit;

import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import javafx.geometry.Pos;
import javafx.geometry.Rectangle2D;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Pane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.ScreenDots;
import sillet.desktop.drawing.strings.Bridge;
import sillet.desktop.drawing.strings.FretMark;
import sillet.desktop.drawing.strings.SheetShape;
import sillet.desktop.drawing.strings.SheetWords;
import sillet.desktop.drawing.strings.StringsDrawing;
import sillet.desktop.drawing.strings.StringsPicture;
import sillet.desktop.theme.Looks;
import sillet.desktop.visit.made.MadeRows;
import sillet.desktop.visit.picture.ShownNeck;
import sillet.desktop.visit.picture.VisitPicture;
import sillet.desktop.visit.readings.Cell;
import sillet.desktop.visit.readings.CentsCallout;
import sillet.desktop.visit.words.FindingLine;
import sillet.desktop.visit.words.NeckNotes;
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
  private final WordsBesideStrings words;
  private final NeckView neck;
  private final NeckTable figures;
  private @Nullable MadeRows made;
  private SheetShape shape = SheetShape.USUAL;
  private boolean turned;
  private int inHand = 1;
  private List<FindingLine> findings = List.of();

  ReadingsPanel(VisitDesk desk, WordsOfVisit said, Runnable changed) {
    this.model = desk.model();
    this.texts = desk.texts();
    this.neck = new NeckView(model, texts);
    this.figures = new NeckTable(texts);
    this.hand = new VisitHand(desk, this::focus, this::entered, changed);
    SheetWords sheetWords =
        new SheetWords(texts.say("visit.sheet.string"), texts.say("visit.sheet.nut"), this::scale);
    this.drawing = new StringsDrawing(picture(), sheetWords, ScreenDots.perInch());
    this.cells = new CellsOnSheet(drawing, texts);
    this.words = new WordsBesideStrings(drawing, texts, said, model);
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
    getChildren().addAll(head, sheet, figures);
    drawing.setOnMouseClicked(this::clicked);
    drawing
        .widthProperty()
        .addListener(
            (property, before, now) -> {
              if (measure()) {
                drawing.show(picture());
                changed.run();
              }
            });
    makeCells();
  }

  private String scale(double along, double across) {
    String factor = Figures.fixed(along, 1).replaceFirst("\\.0$", "");
    return Double.isNaN(across)
        ? texts.say("visit.sheet.along", factor)
        : texts.say("visit.sheet.along-across", factor, Figures.fixed(across, 1));
  }

  private StringsPicture picture() {
    return picture(neck.shown());
  }

  private StringsPicture picture(ShownNeck shown) {
    return new VisitPicture(model.record().instrument(), model.passes(), model.pass(), shown, texts)
        .make(findings, turned);
  }

  /** Makes the cells anew: other frets or another pass. */
  void makeCells() {
    drawing.clearPlaced();
    measure();
    drawing.show(picture());
    cells.make(
        model.record().visit().strings().strings(),
        model.frets().frets(),
        model.record().instrument().neck(),
        hand);
    cells.editable(model.open());
    words.place(shape);
  }

  /** Puts the words anew where a choice changes what stands over them. */
  void placeWords() {
    if (made == null) {
      words.place(shape);
    }
  }

  /** Takes the shape that goes with the width of the window. */
  void setShape(SheetShape wanted) {
    if (wanted != shape) {
      shape = wanted;
      drawing.setShape(wanted);
      if (made == null) {
        words.place(shape);
      }
    }
  }

  /** Shows the readings and what they ask for as they now are. */
  void refresh(List<FindingLine> nowFound, List<StringWords> strings) {
    findings = nowFound;
    drawing.show(picture());
    cells.refresh();
    if (made == null) {
      words.refresh(strings, shape);
    }
    figures.show(NeckNotes.of(model.strings().get(inHand - 1), texts), neck.whole());
    showCallout();
    showHead();
  }

  private void showHead() {
    boolean onePiece = drawing.picture().bridge() instanceof Bridge.OnePiece;
    boolean predicted = anyMark(mark -> mark.predicted() != null);
    boolean estimated = anyMark(FretMark::estimated);
    String moveHead = made == null ? texts.say("visit.words.head") : "";
    head.show(onePiece, model.pass(), new SheetHead.Marks(predicted, estimated), moveHead);
  }

  private boolean anyMark(Predicate<FretMark> such) {
    return drawing.picture().rows().stream().flatMap(row -> row.frets().stream()).anyMatch(such);
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
      words.place(shape);
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
      words.place(shape);
    }
    showHead();
  }

  void focus(Cell cell) {
    inHand = cell.string();
    if (neck.whole()) {
      neck.open(cell.fret());
      drawing.show(picture());
      drawing.layout();
    }
    cells.focus(cell);
  }

  /** The string in hand is the one whose figures stand below the drawing. */
  private void entered(Cell cell) {
    inHand = cell.string();
  }

  private void clicked(MouseEvent click) {
    drawing
        .near(click.getX(), click.getY())
        .ifPresent(place -> cells.at(place.row(), place.neckFret()).ifPresent(this::focus));
  }

  /** Looks whether the cells have room beside their frets; true if that changes the drawing. */
  private boolean measure() {
    return neck.crowd(!drawing.cellsFit(picture(neck.cells())));
  }

  /** Shows the whole neck, or cells beside their frets where these have room. */
  void showWholeNeck(boolean wanted) {
    neck.want(wanted);
    drawing.show(picture());
    drawing.layout();
  }

  NeckView neck() {
    return neck;
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
