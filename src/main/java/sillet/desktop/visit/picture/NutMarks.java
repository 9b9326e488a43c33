package sillet.desktop.visit.picture;

import java.util.ArrayList;
import java.util.List;
import sillet.desktop.drawing.strings.NutMark;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.units.Figures;
import sillet.logbook.visits.StringPass;

/** Where nut edges shall go in a pass: one arrow a string, or one for a nut that moves as one. */
final class NutMarks {
  private static final int DECIMALS = 2;

  private NutMarks() {}

  static List<NutMark> of(List<StringPass> strings) {
    List<NutMark> marks = new ArrayList<>();
    for (int row = 0; row < strings.size(); row++) {
      StringPass string = strings.get(row);
      MoveFigures figures = SaddlePlaces.figures(string);
      Double nut = figures == null ? null : figures.nutMm();
      if (nut != null
          && string.madeMm() == null
          && !Figures.fixed(nut, DECIMALS).matches("-?0.00")) {
        marks.add(new NutMark(row, Figures.fixed(Math.abs(nut), DECIMALS), nut > 0));
      }
    }
    boolean asOne = strings.stream().anyMatch(s -> s.string().room().nut() == NutMovable.WHOLE);
    return asOne && !marks.isEmpty() ? List.of(marks.get((marks.size() - 1) / 2)) : marks;
  }
}
