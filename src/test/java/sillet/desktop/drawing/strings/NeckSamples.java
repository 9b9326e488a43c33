package sillet.desktop.drawing.strings;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

/** The invented instruments read along the whole neck, the cells of one fret open. */
final class NeckSamples {
  static final List<Integer> READ = List.of(1, 2, 3, 5, 7, 9, 12, 15, 17);
  private static final int LAST_ESTIMATED = 12;

  private NeckSamples() {}

  /** All frets to 12 and what was read beyond; the last string has not been read yet. */
  static StringsPicture of(StringsPicture picture, int openFret) {
    List<StringRow> rows = new ArrayList<>();
    for (StringRow row : picture.rows()) {
      rows.add(Samples.with(row, row.saddle(), marks(row).toArray(FretMark[]::new)));
    }
    StringsPicture.Board board =
        StringsPicture.Board.of(picture.board().frets(), READ)
            .with(new StringsPicture.Column(openFret, "fret " + openFret));
    return new StringsPicture(
        rows,
        board,
        picture.bridge(),
        picture.lie(),
        List.of(
            new FindingMark(1, 1, 0, "Nut slot high, string 2"),
            new FindingMark(2, FindingMark.ALL_STRINGS, 7, "Fret 7 misplaced"),
            new FindingMark(3, rows.size() - 1, FindingMark.ON_STRING, "String false")),
        picture.spreadMm(),
        List.of(new NutMark(2, "0.31", true), new NutMark(4, "0.12", false)));
  }

  private static List<FretMark> marks(StringRow row) {
    TreeSet<Integer> frets = new TreeSet<>(READ);
    for (int fret = 1; fret <= LAST_ESTIMATED; fret++) {
      frets.add(fret);
    }
    SaddleMark saddle = row.saddle();
    double way =
        saddle == null || saddle.targetMm() == null ? 0 : saddle.targetMm() - saddle.nowMm();
    List<FretMark> marks = new ArrayList<>();
    for (int fret : frets) {
      double grown = way * 2.7 * (Math.pow(2, fret / 12.0) - 1);
      double humped = row.number() == 2 ? 6 * Math.exp(-fret / 2.5) : 0.8 * Math.exp(-fret / 2.0);
      double stays = humped + (fret == 7 ? 2.4 : 0);
      marks.add(
          READ.contains(fret)
              ? FretMark.read(fret, grown + stays).expecting(stays)
              : FretMark.estimate(fret, grown + stays, stays));
    }
    return marks;
  }
}
