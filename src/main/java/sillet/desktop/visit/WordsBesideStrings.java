package sillet.desktop.visit;

import java.util.ArrayList;
import java.util.List;
import javafx.scene.Node;
import sillet.desktop.drawing.strings.MoveWords;
import sillet.desktop.drawing.strings.SheetShape;
import sillet.desktop.drawing.strings.StringsDrawing;
import sillet.desktop.drawing.strings.WordColumns;
import sillet.desktop.drawing.strings.WordsHead;
import sillet.desktop.visit.picture.MoveTexts;
import sillet.desktop.visit.words.StringWords;
import sillet.logbook.text.Texts;

/** The words at the end of each string: what the readings ask for. */
final class WordsBesideStrings {
  private final StringsDrawing drawing;
  private final Texts texts;
  private final WordsOfVisit said;
  private final VisitModel model;
  private final List<MoveWords> words = new ArrayList<>();

  WordsBesideStrings(StringsDrawing drawing, Texts texts, WordsOfVisit said, VisitModel model) {
    this.drawing = drawing;
    this.texts = texts;
    this.said = said;
    this.model = model;
  }

  /** Puts them into their places for a shape of the window. */
  void place(SheetShape shape) {
    words.clear();
    WordColumns columns = WordColumns.of(shape, drawing.picture());
    MoveTexts set = new MoveTexts(texts, drawing.picture(), shape);
    for (StringWords string : said.of(model)) {
      MoveWords node = new MoveWords(set.of(string), columns);
      words.add(node);
      drawing.setWords(string.string() - 1, node);
    }
    drawing.setWordsHead(head(columns, shape));
  }

  /** Shows what is now asked for. */
  void refresh(List<StringWords> strings, SheetShape shape) {
    WordColumns columns = WordColumns.of(shape, drawing.picture());
    MoveTexts set = new MoveTexts(texts, drawing.picture(), shape);
    for (int row = 0; row < words.size(); row++) {
      words.get(row).show(set.of(strings.get(row)), columns);
    }
  }

  private Node head(WordColumns columns, SheetShape shape) {
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
              : new WordsHead(said.aim(model), "", said.sense(model), columns);
    };
  }
}
