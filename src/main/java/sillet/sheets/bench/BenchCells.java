package sillet.sheets.bench;

import java.util.Arrays;
import java.util.Locale;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.Heights;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.plausible.Plausibility;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;
import sillet.logbook.units.LengthUnit;

/** Reads how a string lies and what its saddle and nut can do. */
final class BenchCells {
  private static final Plausibility USUAL = new Plausibility(LengthUnit.MM);

  private BenchCells() {}

  static Heights heights(Cells cells) {
    Double action12Mm = cells.number(Columns.ACTION_12);
    Double nutgap1Mm = cells.number(Columns.NUT_GAP_1);
    Double reliefMm = cells.number(Columns.RELIEF);
    if (action12Mm != null) {
      cells.warn(Columns.ACTION_12, USUAL.actionMm(action12Mm));
    }
    if (nutgap1Mm != null) {
      cells.warn(Columns.NUT_GAP_1, USUAL.clearanceMm(nutgap1Mm));
    }
    if (reliefMm != null) {
      cells.warn(Columns.RELIEF, USUAL.reliefMm(reliefMm));
    }
    return new Heights(action12Mm, nutgap1Mm, reliefMm);
  }

  static SaddleRoom room(Cells cells) {
    Double screwMm = cells.aboveZero(Columns.SCREW);
    Double backMm = cells.notBelowZero(Columns.ROOM_BACK);
    Double forwardMm = cells.notBelowZero(Columns.ROOM_FORWARD);
    NutMovable nut = word(cells, Columns.NUT_MOVABLE, NutMovable.values(), NutMovable::word);
    // a sheet has no column for the kind of saddle, so no saddle counts as one piece
    return new SaddleRoom(
        screwMm, backMm, forwardMm, null, null, nut == null ? NutMovable.NO : nut);
  }

  /** One of the words a column knows, in any case of letters; null if blank or refused. */
  static <E> @Nullable E word(Cells cells, String name, E[] values, Function<E, String> word) {
    String text = cells.text(name);
    if (text.isEmpty()) {
      return null;
    }
    String asked = text.toLowerCase(Locale.ROOT);
    E found =
        Arrays.stream(values).filter(v -> word.apply(v).equals(asked)).findFirst().orElse(null);
    if (found == null) {
      String words = Arrays.stream(values).map(word).collect(Collectors.joining(", "));
      cells.refuse(name, Message.of("bench.word-unknown", Quoted.of(text), words));
    }
    return found;
  }
}
