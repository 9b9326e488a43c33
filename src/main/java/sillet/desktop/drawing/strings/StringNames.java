package sillet.desktop.drawing.strings;

import java.util.Locale;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Notation;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/**
 * Draws the column beside the nut: number, note, gauge; a bracket joins the strings of a course.
 */
final class StringNames {
  private static final double NARROW_EM = 6;

  private final Pen pen;
  private final SheetGeometry sheet;
  private final double left;
  private final double right;
  private final boolean narrow;
  private final boolean courses;

  StringNames(Pen pen, SheetGeometry sheet) {
    this.pen = pen;
    this.sheet = sheet;
    Box column = sheet.names();
    boolean mirrored = sheet.away() < 0;
    this.narrow = sheet.measures().names() < NARROW_EM;
    this.left = column.x() + (mirrored ? pen.em(narrow ? 0.57 : 1) : 0);
    this.courses = sheet.picture().hasCourses();
    this.right = column.right() - (mirrored ? 0 : pen.em(narrow || courses ? 0.57 : 0.86));
  }

  void paint(SheetWords words, TakenRoom headLine) {
    Lettering head = Lettering.plain(0.86, pen.inks().soft());
    double width = head.width(words.strings(), pen.em(1));
    headLine.take(left + width / 2, width);
    pen.textAround(words.strings(), head, left, sheet.headLineY());
    for (int row = 0; row < sheet.rows().count(); row++) {
      one(sheet.picture().rows().get(row), sheet.rows().y(row));
      if (courses) {
        course(row);
      }
    }
  }

  private void one(StringRow string, double y) {
    double upper = narrow ? y - pen.em(0.57) : y;
    double numberX = left + pen.em(courses ? 2.93 : 0);
    double noteX = left + pen.em(courses ? 3.43 : narrow ? 1.24 : 1.57);
    Lettering number = Lettering.bold(1.14, pen.inks().ink());
    if (courses && narrow) {
      numberX = left + pen.em(2.1);
      noteX = left + pen.em(2.36);
    }
    pen.textAround(
        String.format(Locale.ROOT, "%d", string.number()),
        courses ? number.endingThere() : number,
        numberX,
        upper);
    Notation.of(string.note()).paint(pen, Lettering.plain(1, pen.inks().ink()), noteX, upper);
    Lettering gauge = Lettering.plain(narrow ? 0.86 : 0.93, pen.inks().soft());
    if (narrow) {
      pen.textAround(string.gauge(), gauge, courses ? noteX : left, y + pen.em(0.64));
    } else {
      pen.textAround(string.gauge(), gauge.endingThere(), right, y);
    }
  }

  /** A thin bracket with the course number, drawn once for each course of two or more. */
  private void course(int row) {
    StringsPicture picture = sheet.picture();
    int last = row;
    while (last + 1 < sheet.rows().count() && picture.closeToTheOneBefore(last + 1)) {
      last++;
    }
    if (last == row || picture.closeToTheOneBefore(row)) {
      return;
    }
    double from = pen.middle(Math.min(sheet.rows().y(row), sheet.rows().y(last)));
    double to = pen.middle(Math.max(sheet.rows().y(row), sheet.rows().y(last)));
    double x = pen.middle(left + pen.em(narrow ? 0.29 : 1));
    double arm = pen.em(narrow ? 0.21 : 0.29);
    Stroke thin = new Stroke(pen.inks().line(), 1);
    pen.path(thin, x + arm, from, x, from, x, to, x + arm, to);
    if (!narrow) {
      Lettering number = Lettering.plain(0.86, pen.inks().soft());
      String text = String.format(Locale.ROOT, "%d", picture.rows().get(row).course());
      pen.textAround(text, number, left, (from + to) / 2);
    }
  }
}
