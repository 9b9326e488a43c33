package sillet.desktop.drawing;

/**
 * A note as typed, taken apart for drawing: sharps and flats are paths, as the type has neither.
 *
 * @param letter A to G
 * @param accidental natural, sharp or flat
 * @param rest what follows, the octave
 */
public record Notation(String letter, Accidental accidental, String rest) {
  /** What stands between letter and octave. */
  public enum Accidental {
    NATURAL,
    SHARP,
    FLAT
  }

  private static final double WIDTH = 0.5;

  /** Takes {@code F#3} or {@code Bb2} apart; any other text stays one piece. */
  public static Notation of(String typed) {
    if (typed.length() >= 2 && "ABCDEFG".indexOf(typed.charAt(0)) >= 0) {
      char second = typed.charAt(1);
      if (second == '#') {
        return new Notation(typed.substring(0, 1), Accidental.SHARP, typed.substring(2));
      }
      if (second == 'b') {
        return new Notation(typed.substring(0, 1), Accidental.FLAT, typed.substring(2));
      }
    }
    return new Notation(typed, Accidental.NATURAL, "");
  }

  /** Draws the note; the point is where its letter begins, on the middle of its capitals. */
  public void paint(Pen pen, Lettering type, double x, double middleY) {
    pen.textAround(letter, type, x, middleY);
    if (accidental == Accidental.NATURAL) {
      return;
    }
    double size = pen.em(type.sizeEm());
    double after = x + type.width(letter, pen.em(1));
    Stroke thin = new Stroke(type.colour(), Math.max(1, size * (type.bold() ? 0.1 : 0.075)));
    Stroke thick = new Stroke(type.colour(), Math.max(1.3, size * 0.11));
    double middle = after + size * 0.22;
    if (accidental == Accidental.SHARP) {
      sharp(pen, middle, middleY, size, thin, thick);
    } else {
      flat(pen, middle, middleY, size, thin);
    }
    pen.textAround(rest, type, after + size * WIDTH, middleY);
  }

  private static void sharp(Pen pen, double x, double y, double size, Stroke thin, Stroke thick) {
    double out = size * 0.09;
    double tall = size * 0.42;
    pen.line(x - out, y - tall + size * 0.04, x - out, y + tall + size * 0.04, thin);
    pen.line(x + out, y - tall - size * 0.04, x + out, y + tall - size * 0.04, thin);
    double wide = size * 0.2;
    for (double bar : new double[] {-0.13, 0.13}) {
      double at = y + size * bar;
      pen.line(x - wide, at + size * 0.05, x + wide, at - size * 0.05, thick);
    }
  }

  private static void flat(Pen pen, double x, double y, double size, Stroke thin) {
    double left = x - size * 0.14;
    double foot = y + size * 0.36;
    pen.line(left, y - size * 0.48, left, foot, thin);
    pen.path(
        thin,
        left,
        foot - size * 0.02,
        left + size * 0.2,
        foot - size * 0.2,
        left + size * 0.25,
        foot - size * 0.33,
        left + size * 0.2,
        foot - size * 0.42,
        left + size * 0.1,
        foot - size * 0.42,
        left,
        foot - size * 0.32);
  }

  /** Width of the whole note in px when one em is so many px. */
  public double width(Lettering type, double emPx) {
    double plain = type.width(letter, emPx) + type.width(rest, emPx);
    return accidental == Accidental.NATURAL ? plain : plain + type.sizeEm() * emPx * WIDTH;
  }
}
