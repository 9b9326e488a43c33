package sillet.desktop.sets;

import javafx.scene.control.Label;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.sets.MaterialCatalogue;
import sillet.acoustics.sets.MaterialSource;
import sillet.acoustics.sets.MaterialSource.Span;
import sillet.acoustics.sets.SourceMark;
import sillet.acoustics.wire.Material;
import sillet.desktop.controls.FigureTable;
import sillet.desktop.controls.FigureTable.Column;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** What strings are made of, source by source, and how well each source is known. */
final class MaterialsView extends VBox {
  private static final double GIGA = 1e9;

  MaterialsView(Texts texts) {
    FigureTable table =
        new FigureTable(Column.WORDS, Column.FIGURE, Column.FIGURE, Column.SENTENCE, Column.WORDS);
    table.head(
        texts.say("sets.material"),
        texts.say("sets.modulus"),
        texts.say("sets.density"),
        texts.say("sets.source"),
        texts.say("sets.known"));
    @Nullable Material before = null;
    for (MaterialSource one : MaterialCatalogue.sources()) {
      boolean first = one.material() != before;
      before = one.material();
      table.row(
          first ? FigureTable.strong(texts.say(key(one.material()))) : "",
          written(one.modulus(), GIGA),
          written(one.density(), 1),
          one.source(),
          FigureTable.soft(texts.say(key(one.mark()))));
    }
    Label spread = new Label(texts.say("sets.materials-spread"));
    spread.getStyleClass().add(Looks.SENTENCE);
    spread.setWrapText(true);
    spread.setMinHeight(USE_PREF_SIZE);
    getStyleClass().add("ladder");
    getChildren().addAll(spread, table);
  }

  private static String written(@Nullable Span span, double unit) {
    if (span == null) {
      return "";
    }
    String low = figure(span.low() / unit);
    return span.low() == span.high() ? low : low + "\u2013" + figure(span.high() / unit);
  }

  private static String figure(double value) {
    return Figures.fixed(value, value == Math.rint(value) ? 0 : 1);
  }

  private static String key(Material material) {
    return switch (material) {
      case MUSIC_WIRE -> "sets.music-wire";
      case STEEL_WRAP -> "sets.steel-wrap";
      case NICKEL -> "sets.nickel";
      case BRONZE -> "sets.bronze";
      case NYLON -> "sets.nylon";
      case FLUOROCARBON -> "sets.fluorocarbon";
      case GUT -> "sets.gut";
    };
  }

  private static String key(SourceMark mark) {
    return switch (mark) {
      case READ -> "sets.mark-read";
      case QUOTED -> "sets.mark-quoted";
      case MEMORY -> "sets.mark-memory";
      case COMPUTED -> "sets.mark-computed";
    };
  }
}
