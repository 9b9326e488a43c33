package sillet.desktop.drawing.strings;

import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.IntFunction;
import sillet.desktop.drawing.Lettering;
import sillet.desktop.drawing.Pen;
import sillet.desktop.drawing.Snap;
import sillet.desktop.drawing.Stroke;

/** Draws the two steel rules under the sheet, each for its own scale. */
final class Rules {
  private static final double LABEL_EM = 1.14;
  private static final double LABEL_ROOM_EM = 2.4;
  private static final double LABEL_GAP_EM = 0.36;
  private static final int[] LABEL_STEPS = {1, 2, 3, 5, 10, 20};
  private static final String MM = "\u00a0mm";

  private final Pen pen;
  private final SheetGeometry sheet;
  private final Stroke thin;
  private final Lettering lettering;

  Rules(Pen pen, SheetGeometry sheet) {
    this.pen = pen;
    this.sheet = sheet;
    this.thin = new Stroke(pen.inks().soft(), 1);
    this.lettering = Lettering.plain(0.86, pen.inks().soft()).centred();
  }

  /** 10 mm ticks along the neck, figures every 100. */
  void paintNeckRule() {
    NeckStripGeometry strip = sheet.strip();
    pen.level(strip.x(0), sheet.boardEnd(), sheet.ruleY(), thin);
    int last = (int) Math.floor(strip.lengthMm() / 10) * 10;
    for (int mm = 0; mm <= last; mm += 10) {
      tick(strip.x(mm), mm % 100 == 0 ? 0.57 : mm % 50 == 0 ? 0.43 : 0.29);
      if (mm % 100 == 0) {
        label(strip.x(mm), plain(mm) + (mm + 100 > last ? MM : ""));
      }
    }
  }

  /** 1 mm, half and tenth ticks at the bridge where they can be told apart. */
  void paintBridgeRule() {
    BridgePlanGeometry plan = sheet.plan();
    double from = Math.ceil(plan.lowMm() * 10 - 1e-6) / 10;
    double to = Math.floor(plan.highMm() * 10 + 1e-6) / 10;
    pen.level(plan.x(from), plan.x(to), sheet.ruleY(), thin);
    double perTenth = Math.abs(plan.pxPerMm()) / 10;
    int step = perTenth >= 2 ? 1 : perTenth * 5 >= 3 ? 5 : 10;
    for (int tenth = (int) Snap.px(from * 10); tenth <= Snap.px(to * 10); tenth++) {
      if (tenth % step == 0) {
        tick(plan.x(tenth / 10.0), tenth % 10 == 0 ? 0.57 : tenth % 5 == 0 ? 0.43 : 0.29);
      }
    }
    if (sheet.picture().bridge() instanceof Bridge.OnePiece onePiece) {
      onePieceLabels(onePiece);
    } else if (sheet.picture().bridge() instanceof Bridge.SingleSaddles saddles) {
      saddleLabels(saddles, from, to);
    }
  }

  private void saddleLabels(Bridge.SingleSaddles saddles, double from, double to) {
    label(sheet.plan().x(0), saddles.nominal());
    free(step -> signed(from, to, step), saddles.nominal())
        .forEach((mm, text) -> label(sheet.plan().x(mm), text));
  }

  /** The labels of the closest step at which none is written over another. */
  private Map<Integer, String> free(IntFunction<Map<Integer, String>> forStep, String zero) {
    for (int step : LABEL_STEPS) {
      Map<Integer, String> labels = forStep.apply(step);
      TakenRoom taken = new TakenRoom();
      taken.take(sheet.plan().x(0), width(zero));
      boolean free =
          labels.entrySet().stream()
              .allMatch(
                  label ->
                      taken.takeIfFree(
                          sheet.plan().x(label.getKey()),
                          width(label.getValue()),
                          pen.em(LABEL_GAP_EM)));
      if (free) {
        return labels;
      }
    }
    return Map.of();
  }

  private static Map<Integer, String> signed(double from, double to, int step) {
    Map<Integer, String> labels = new TreeMap<>();
    int last = (int) Math.floor(to / step) * step;
    for (int mm = (int) Math.ceil(from / step) * step; mm <= last; mm += step) {
      if (mm != 0) {
        labels.put(mm, (mm > 0 ? "+" : "\u2212") + plain(Math.abs(mm)) + (mm == last ? MM : ""));
      }
    }
    return labels;
  }

  private double width(String text) {
    return lettering.width(text, pen.em(1));
  }

  private void onePieceLabels(Bridge.OnePiece onePiece) {
    int step = labelStep();
    double x = sheet.plan().x(0);
    label(x, "0");
    double wordX = x - sheet.away() * pen.em(0.57);
    Lettering before =
        sheet.away() > 0 ? lettering.endingThere() : Lettering.plain(0.86, lettering.colour());
    pen.textAround(onePiece.front(), before, wordX, sheet.ruleY() + pen.em(LABEL_EM));
    for (int mm = step; mm < onePiece.widthMm() - 0.4 * step; mm += step) {
      label(sheet.plan().x(mm), plain(mm));
    }
    label(sheet.plan().x(onePiece.widthMm()), onePiece.width() + MM);
  }

  private int labelStep() {
    double perMm = Math.abs(sheet.plan().pxPerMm());
    for (int step : LABEL_STEPS) {
      if (step * perMm >= pen.em(LABEL_ROOM_EM)) {
        return step;
      }
    }
    return 50;
  }

  private void tick(double x, double lengthEm) {
    pen.upright(x, sheet.ruleY(), sheet.ruleY() + pen.em(lengthEm), thin);
  }

  private void label(double x, String text) {
    pen.textAround(text, lettering, x, sheet.ruleY() + pen.em(LABEL_EM));
  }

  private static String plain(int figure) {
    return String.format(Locale.ROOT, "%d", figure);
  }
}
