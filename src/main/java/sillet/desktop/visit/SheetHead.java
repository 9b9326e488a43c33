package sillet.desktop.visit;

import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import org.jspecify.annotations.Nullable;
import sillet.desktop.drawing.ScreenDots;
import sillet.desktop.drawing.strings.LegendGlyph;
import sillet.desktop.drawing.strings.SheetGeometry;
import sillet.desktop.drawing.strings.SheetMeasures;
import sillet.desktop.drawing.strings.StringsDrawing;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/** The heads above the drawing, each over its own part of it, and what the signs mean. */
final class SheetHead extends Region {
  private final StringsDrawing drawing;
  private final Texts texts;
  private final HBox title;
  private final HBox legend = new HBox();
  private final Label plan = new Label();
  private final Label move = new Label();
  private final HBox actions;
  private @Nullable Shown shown;

  private record Shown(
      boolean onePiece, int pass, Marks marks, String moveHead, SheetMeasures measures) {}

  /** Marks that only sometimes stand on the drawing. */
  record Marks(boolean predicted, boolean estimated) {}

  SheetHead(StringsDrawing drawing, Texts texts, HBox title, HBox actions) {
    this.drawing = drawing;
    this.texts = texts;
    this.title = title;
    this.actions = actions;
    plan.getStyleClass().add(Looks.PANEL_HEAD);
    move.getStyleClass().add(Looks.PANEL_HEAD);
    legend.getStyleClass().add("legend");
    legend.setAlignment(Pos.CENTER_LEFT);
    getStyleClass().add("sheet-head");
    getChildren().addAll(title, legend, plan, move, actions);
  }

  /** Says what stands where. */
  void show(boolean onePiece, int pass, Marks marks, String moveHead) {
    Shown wanted = new Shown(onePiece, pass, marks, moveHead, drawing.measures());
    if (wanted.equals(shown)) {
      return;
    }
    shown = wanted;
    plan.setText(texts.say(onePiece ? "visit.sheet.saddle" : "visit.sheet.plan"));
    move.setText(moveHead);
    legend.getChildren().clear();
    sign(LegendGlyph.Sign.TEN_CENTS, texts.say("visit.sheet.ten-cents"));
    sign(LegendGlyph.Sign.READ, texts.say("visit.sheet.read"));
    if (marks.estimated()) {
      sign(LegendGlyph.Sign.ESTIMATED, texts.say("visit.sheet.estimated"));
    }
    if (marks.predicted()) {
      sign(LegendGlyph.Sign.PREDICTED, texts.say("visit.sheet.predicted"));
    }
    if (pass > 1) {
      String before = Integer.toString(pass - 1);
      sign(LegendGlyph.Sign.PASS_BEFORE, texts.say("visit.sheet.pass", before));
    }
    requestLayout();
  }

  private void sign(LegendGlyph.Sign sign, String word) {
    Label said = new Label(word);
    said.getStyleClass().add(Looks.NOTE);
    said.setMinWidth(USE_PREF_SIZE);
    HBox both = new HBox(new LegendGlyph(sign, drawing.measures(), word), said);
    both.getStyleClass().add("legend-sign");
    both.setAlignment(Pos.CENTER_LEFT);
    legend.getChildren().add(both);
  }

  @Override
  protected void layoutChildren() {
    List.<Node>of(title, legend, plan, move, actions).forEach(Node::autosize);
    // the drawing below is as wide, but it is laid out after its head
    SheetGeometry sheet =
        new SheetGeometry(
            drawing.picture(),
            drawing.measures(),
            new SheetGeometry.Frame(getWidth(), drawing.em(), ScreenDots.perInch()));
    double em = sheet.em();
    double words = sheet.words(0).x();
    double bridge = em * drawing.measures().bridge();
    boolean mirrored = drawing.picture().lie().bridgeLeft();
    double planX = mirrored ? sheet.words(0).right() + em : words - em - bridge;
    double stripEnd = mirrored ? getWidth() : planX - em * 2;
    double titleX = mirrored ? planX + bridge + em * 2 : 0;
    put(title, titleX);
    double free = titleX + title.getWidth() + em;
    double legendX = stripEnd - legend.getWidth();
    legend.setVisible(legendX >= free);
    put(legend, legendX);
    put(plan, planX + em * 1.36);
    put(move, words);
    put(actions, words + sheet.words(0).width() - actions.getWidth());
  }

  private void put(Region node, double x) {
    node.relocate(Math.rint(x), Math.rint((getHeight() - node.getHeight()) / 2));
  }

  @Override
  protected double computePrefHeight(double width) {
    return Math.max(actions.prefHeight(-1), title.prefHeight(-1));
  }

  @Override
  protected double computeMinHeight(double width) {
    return computePrefHeight(width);
  }
}
