package sillet.desktop.history;

import java.time.LocalDate;
import java.util.List;
import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;

/** The years under the plots. */
final class YearRow extends DrawnBand {
  private static final int MOST_YEARS = 8;

  private final YearAxis axis;

  YearRow(YearAxis axis) {
    super(20, 6, 1.71);
    this.axis = axis;
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    Lettering type = Lettering.plain(0.86, pen.inks().soft());
    List<LocalDate> years = axis.years(MOST_YEARS);
    for (LocalDate year : years) {
      double x = axis.share(year) * width;
      pen.textAround(Integer.toString(year.getYear()), type, x + pen.em(0.29), height / 2);
    }
  }
}
