package sillet.desktop.pickups;

import java.util.List;
import sillet.acoustics.pickups.PickupPlace;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.desktop.drawing.Box;
import sillet.desktop.drawing.DrawnBand;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Stroke;

/**
 * The string from nut to bridge, a row for each harmonic with its nodes as dots, and the pickups as
 * uprights through all rows: where an upright meets a node there is a full block, and that harmonic
 * is hardly heard.
 */
final class NodePicture extends DrawnBand {
  private static final int FIRST = 2;
  private static final int LAST = 8;
  private static final double ROW_EM = 1.5;
  private static final double HEAD_EM = 1.9;
  private static final double LEFT_EM = 2.3;
  private static final double RIGHT_EM = 1;

  private List<PickupPlace> places = List.of();
  private List<String> names = List.of();
  private int fret;
  private final String nut;
  private final String bridge;

  NodePicture(String nut, String bridge) {
    super(34, 16, HEAD_EM + ROW_EM * (LAST - FIRST + 1) + HEAD_EM);
    this.nut = nut;
    this.bridge = bridge;
  }

  /** Shows pickups and the fret where the string is pressed, 0 for the open string. */
  void show(List<PickupPlace> newPlaces, List<String> newNames, int atFret) {
    places = List.copyOf(newPlaces);
    names = List.copyOf(newNames);
    fret = atFret;
    requestLayout();
  }

  @Override
  protected void draw(Pen pen, double width, double height) {
    double from = pen.em(LEFT_EM);
    double to = width - pen.em(RIGHT_EM);
    double begin = to - (to - from) / EqualTemperament.ratio(fret);
    double foot = pen.em(HEAD_EM + ROW_EM * (LAST - FIRST + 1));
    Lettering note = Lettering.plain(0.86, pen.inks().soft());
    pen.textAround(nut, note.centred(), from, pen.em(HEAD_EM * 0.5));
    pen.textAround(bridge, note.endingThere(), width, pen.em(HEAD_EM * 0.5));
    pen.upright(from, pen.em(HEAD_EM), foot, new Stroke(pen.inks().ink(), pen.atLeast(3, 0.29)));
    pen.upright(to, pen.em(HEAD_EM), foot, new Stroke(pen.inks().ink(), pen.atLeast(2, 0.14)));
    if (fret > 0) {
      pen.upright(
          begin, pen.em(HEAD_EM), foot, new Stroke(pen.inks().line(), pen.atLeast(2, 0.14)));
      pen.textAround(Integer.toString(fret), note.centred(), begin, foot + pen.em(HEAD_EM * 0.45));
    }
    for (PickupPlace place : places) {
      double x = to - (to - from) * place.share(0);
      pen.block(
          pen.inks().line(),
          new Box(x - pen.em(0.14), pen.em(HEAD_EM), pen.em(0.29), foot - pen.em(HEAD_EM)));
    }
    for (int harmonic = FIRST; harmonic <= LAST; harmonic++) {
      row(pen, harmonic, begin, to);
    }
    names(pen, from, to, foot);
  }

  private void row(Pen pen, int harmonic, double begin, double to) {
    double y = pen.em(HEAD_EM + ROW_EM * (harmonic - FIRST + 0.5));
    Lettering number = Lettering.plain(0.86, pen.inks().soft());
    pen.textAround(Integer.toString(harmonic), number, 0, y);
    pen.level(begin, to, y, new Stroke(pen.inks().hair(), 1));
    for (int node = 1; node < harmonic; node++) {
      double x = to - (to - begin) * node / harmonic;
      pen.dot(pen.inks().soft(), x, y, pen.em(0.21));
    }
    for (PickupPlace place : places) {
      if (place.unheard(fret, LAST).contains(harmonic)) {
        double x = to - (to - begin) * place.share(fret);
        pen.block(pen.inks().ink(), Box.around(x, y, pen.em(0.57), pen.em(0.93)));
      }
    }
  }

  private void names(Pen pen, double from, double to, double foot) {
    Lettering name = Lettering.plain(0.86, pen.inks().ink());
    double free = Double.POSITIVE_INFINITY;
    for (int i = 0; i < places.size(); i++) {
      double x = to - (to - from) * places.get(i).share(0);
      double half = name.width(names.get(i), pen.em(1)) / 2;
      if (x + half < free) {
        pen.textAround(names.get(i), name.centred(), x, foot + pen.em(HEAD_EM * 0.45));
        free = x - half - pen.em(0.43);
      }
    }
  }
}
