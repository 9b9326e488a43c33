package sillet.desktop.drawing.strings;

import java.util.Locale;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.Parent;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.theme.Looks;

/** A sheet as a screen would set it up: cells, words, head and legend. */
final class SheetScene {
  private static final double DOTS_PER_INCH = 96;

  private final StringsPicture picture;
  private final SheetShape shape;
  private final boolean empty;

  private SheetScene(StringsPicture picture, SheetShape shape, boolean empty) {
    this.picture = picture;
    this.shape = shape;
    this.empty = empty;
  }

  static Parent build(StringsPicture picture, SheetShape shape) {
    return new SheetScene(picture, shape, false).whole();
  }

  static Parent unread(StringsPicture picture, SheetShape shape) {
    return new SheetScene(picture, shape, true).whole();
  }

  private Parent whole() {
    StringsDrawing drawing =
        new StringsDrawing(
            picture,
            new SheetWords(
                picture.hasCourses() && shape != SheetShape.NARROW ? "Course, string" : "String",
                "nut",
                (along, across) ->
                    String.format(Locale.ROOT, "along \u00d7%.1f", along)
                        + (Double.isNaN(across) || shape == SheetShape.NARROW
                            ? ""
                            : String.format(Locale.ROOT, ", across \u00d7%.1f", across))),
            DOTS_PER_INCH);
    drawing.setShape(shape);
    WordColumns columns = WordColumns.of(shape, picture);
    for (int row = 0; row < picture.rows().size(); row++) {
      cells(drawing, row);
      drawing.setWords(row, new MoveWords(words(picture.rows().get(row)), columns));
    }
    if (columns.line() == WordColumns.Line.ONE) {
      drawing.setWordsHead(new WordsHead("turns", "mm", "left", columns));
    } else if (columns.line() == WordColumns.Line.PLACE) {
      drawing.setWordsHead(
          new WordsHead("file the break point", "", "mm from front edge", columns));
    } else if (shape == SheetShape.NARROW) {
      drawing.setWordsHead(new WordsHead("turns", "", "mm left", columns));
    }
    VBox panel = new VBox(head(drawing.measures()), drawing);
    panel.getStyleClass().add(Looks.PANEL);
    VBox page = new VBox(panel);
    page.getStyleClass().add(Looks.PAGE);
    return page;
  }

  private void cells(StringsDrawing drawing, int row) {
    StringRow string = picture.rows().get(row);
    for (FretMark mark : string.frets()) {
      boolean read = mark.cents() != null && !empty;
      TextField cell = new TextField(read ? signed(mark.cents()) : "");
      cell.getStyleClass().add(Looks.READING_CELL);
      cell.pseudoClassStateChanged(Looks.UNREAD, !read);
      cell.pseudoClassStateChanged(Looks.STALE, mark.stale());
      drawing.setCell(row, mark.fret() + string.startFret(), cell);
      if (row == 2 && mark.fret() == 5 && read && !mark.stale()) {
        cell.setText("2.6 2.8 3.3");
        cell.pseudoClassStateChanged(PseudoClass.getPseudoClass("focused"), true);
        drawing.widen(row, mark.fret());
      }
    }
  }

  private static String signed(double cents) {
    return String.format(Locale.ROOT, "%+.1f", cents).replace('-', '\u2212');
  }

  private MoveText words(StringRow string) {
    SaddleMark saddle = string.saddle();
    if (saddle == null || (saddle.targetMm() == null && saddle.lowMm() == null)) {
      if (string.frets().stream().anyMatch(FretMark::stale)) {
        return MoveText.verdict(MarkShape.READ_AGAIN, "read again")
            .below("", "nut slot 2 cut at 21:31", "")
            .inPencil();
      }
      boolean read = string.frets().stream().anyMatch(mark -> mark.cents() != null);
      return read
          ? MoveText.verdict(MarkShape.INSIDE, "within 1 cent")
              .below("", "+5.0 before, +0.1 now", "")
          : MoveText.verdict(MarkShape.NOT_YET, "not read yet");
    }
    if (saddle.targetMm() == null) {
      return MoveText.verdict(MarkShape.LEAVE, "leave it")
          .below("0.11" + (tight() ? "" : "\u00a0mm"), "less than readings can tell", "")
          .at("at", String.format(Locale.ROOT, "%.2f", saddle.nowMm()));
    }
    return move(saddle, saddle.targetMm());
  }

  private MoveText move(SaddleMark saddle, double target) {
    boolean away = target > saddle.nowMm();
    boolean right = away != picture.lie().bridgeLeft();
    boolean tight = tight();
    boolean narrow = shape == SheetShape.NARROW;
    boolean onePiece = picture.isOnePiece();
    double mm = Math.abs(target - saddle.nowMm());
    String detail = String.format(Locale.ROOT, "%.2f to %.2f", Math.max(0, mm - 0.21), mm + 0.21);
    MoveText text =
        MoveText.move(
                right ? MarkShape.ARROW_RIGHT : MarkShape.ARROW_LEFT,
                onePiece ? "" : turns(mm / 0.5),
                tight || narrow ? "" : "turns",
                away ? "away from neck" : "toward neck")
            .below(
                String.format(Locale.ROOT, "%.2f%s", mm, tight ? "" : "\u00a0mm"),
                detail,
                tight || narrow ? "4.7" : onePiece ? "0.72 left" : "4.7 mm left")
            .at("at", String.format(Locale.ROOT, "%.2f", saddle.reachableMm()));
    boolean slot = target > saddle.reachableMm();
    return slot ? text.below("", "slot: 0.57 mm short, +1.5 cents stay", "").inPencil() : text;
  }

  private boolean tight() {
    return WordColumns.of(shape, picture).line() == WordColumns.Line.ONE;
  }

  private static String turns(double turns) {
    int eighths = (int) Math.rint(turns * 8);
    String[] parts = {"", "\u215b", "\u00bc", "\u215c", "\u00bd", "\u215d", "\u00be", "\u215e"};
    return (eighths >= 8 ? Integer.toString(eighths / 8) : "") + parts[eighths % 8];
  }

  private static HBox head(SheetMeasures measures) {
    Label readings = new Label("Readings");
    readings.getStyleClass().add(Looks.PANEL_HEAD);
    Label pass = new Label("pass 1");
    pass.getStyleClass().add(Looks.SOFT);
    Region room = new Region();
    HBox.setHgrow(room, Priority.ALWAYS);
    HBox head = new HBox(10, readings, pass, room);
    LegendGlyph.Sign[] signs = LegendGlyph.Sign.values();
    String[] words = {"10 cents", "read", "estimated", "predicted", "pass 1"};
    for (int i = 0; i < signs.length; i++) {
      Label word = new Label(words[i]);
      word.getStyleClass().add(Looks.NOTE);
      head.getChildren().addAll(new LegendGlyph(signs[i], measures, words[i]), word);
    }
    head.setAlignment(Pos.CENTER_LEFT);
    return head;
  }
}
