package sillet.desktop.visit;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import sillet.desktop.drawing.strings.StringsDrawing;
import sillet.desktop.visit.picture.ShortNut;
import sillet.desktop.visit.readings.Cell;
import sillet.desktop.visit.readings.CellFace;
import sillet.desktop.visit.readings.CellField;
import sillet.desktop.visit.readings.GridHand;
import sillet.logbook.instruments.Neck;
import sillet.logbook.strings.FittedString;
import sillet.logbook.text.Texts;

/** The cells of the entry grid in their places on the drawing. */
final class CellsOnSheet {
  private final StringsDrawing drawing;
  private final Texts texts;
  private final Map<Cell, CellField> fields = new LinkedHashMap<>();
  private final Map<Cell, Integer> neckFrets = new LinkedHashMap<>();
  private boolean editable = true;

  CellsOnSheet(StringsDrawing drawing, Texts texts) {
    this.drawing = drawing;
    this.texts = texts;
  }

  /** Makes a cell for each string and shown fret. */
  void make(List<FittedString> strings, List<Integer> frets, Neck neck, GridHand hand) {
    fields.clear();
    neckFrets.clear();
    for (FittedString string : strings) {
      int start = ShortNut.startFret(string, neck);
      for (int fret : frets) {
        Cell cell = new Cell(string.number(), fret);
        CellField field = new CellField(cell, hand, name(string, fret));
        field.field().setEditable(editable);
        fields.put(cell, field);
        neckFrets.put(cell, fret + start);
        drawing.setCell(string.number() - 1, fret + start, field);
      }
    }
  }

  private String name(FittedString string, int fret) {
    return texts.say(
        "visit.grid.cell",
        Integer.toString(string.number()),
        string.pitch().typed(),
        Integer.toString(fret));
  }

  /** Nothing is typed any more once the instrument was handed out. */
  void editable(boolean open) {
    editable = open;
    fields.values().forEach(field -> field.field().setEditable(open));
  }

  void refresh() {
    fields.values().forEach(CellField::refresh);
    Optional<CellField> typing = focused();
    if (typing.isPresent() && severalIn(typing.get())) {
      Cell cell = typing.get().cell();
      drawing.widen(cell.string() - 1, neckFret(cell));
    } else {
      drawing.narrow();
    }
  }

  private static boolean severalIn(CellField field) {
    return field.field().getText().strip().matches(".*[\\s/].*");
  }

  private Optional<CellField> focused() {
    return fields.values().stream().filter(field -> field.field().isFocused()).findFirst();
  }

  int neckFret(Cell cell) {
    return neckFrets.getOrDefault(cell, cell.fret());
  }

  /** The cell of a string at a fret of the neck. */
  Optional<Cell> at(int row, int neckFret) {
    return neckFrets.entrySet().stream()
        .filter(cell -> cell.getKey().string() == row + 1 && cell.getValue() == neckFret)
        .map(Map.Entry::getKey)
        .findFirst();
  }

  /** The first cell that cannot be read and in which nobody types. */
  Optional<Cell> wrong(GridHand hand) {
    return fields.entrySet().stream()
        .filter(entry -> !entry.getValue().field().isFocused())
        .map(Map.Entry::getKey)
        .filter(cell -> hand.face(cell).state() == CellFace.State.ERROR)
        .findFirst();
  }

  void focus(Cell cell) {
    CellField field = fields.get(cell);
    if (field != null) {
      field.requestFocus();
    }
  }
}
