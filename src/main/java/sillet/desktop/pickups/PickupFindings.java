package sillet.desktop.pickups;

import java.util.List;
import java.util.stream.Collectors;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.pickups.MagnetPull;
import sillet.acoustics.pickups.PickupPlace;
import sillet.desktop.controls.AtBench;
import sillet.desktop.controls.Days;
import sillet.desktop.controls.FigureTable;
import sillet.desktop.controls.FigureTable.Column;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;

/** What the pickups hear, how their magnets pull, and the log of their heights. */
final class PickupFindings extends VBox {
  private static final int HIGHEST = 12;
  private static final double PERCENT = 100;

  private final Texts texts;
  private final LengthUnit unit;
  private final VBox hears = new VBox();
  private final VBox heights = new VBox();

  PickupFindings(Texts texts, AtBench atBench) {
    this.texts = texts;
    this.unit = atBench.shop().lengthUnit();
    Label caution = new Label(texts.say("pickups.caution"));
    caution.getStyleClass().add(Looks.CAUTION);
    wrap(caution);
    for (VBox part : List.of(hears, heights)) {
      part.getStyleClass().add("fret-findings");
    }
    getStyleClass().add("fret-findings");
    getChildren()
        .addAll(
            head(texts.say("pickups.hears")),
            hears,
            caution,
            head(texts.say("pickups.heights")),
            heights);
    log(List.of());
  }

  void show(PickupsModel model, List<PickupPlace> places, List<String> names) {
    hears.getChildren().clear();
    if (places.isEmpty()) {
      hears.getChildren().add(sentence(texts.say("pickups.none")));
      return;
    }
    int fret = model.fret().value().orElse(0);
    FigureTable table =
        new FigureTable(Column.WORDS, Column.WORDS, Column.FIGURE, Column.FIGURE, Column.SENTENCE);
    table.head(
        texts.say("pickups.name"),
        "",
        texts.say("pickups.share"),
        texts.say("pickups.pull"),
        texts.say("pickups.unheard"));
    for (int i = 0; i < places.size(); i++) {
      row(table, FigureTable.strong(names.get(i)), places.get(i), 0);
      if (fret > 0) {
        row(table, new Label(""), places.get(i), fret);
      }
    }
    Label note = new Label(texts.say("pickups.limits"));
    note.getStyleClass().add(Looks.NOTE);
    wrap(note);
    hears.getChildren().addAll(table, note);
  }

  private void row(FigureTable table, Label name, PickupPlace place, int fret) {
    String where =
        fret == 0
            ? texts.say("pickups.open")
            : texts.say("pickups.fret-short", Integer.toString(fret));
    boolean over = place.share(fret) >= 1;
    String unheard =
        place.unheard(fret, HIGHEST).stream()
            .map(k -> Integer.toString(k))
            .collect(Collectors.joining(", "));
    table.row(
        name,
        FigureTable.soft(where),
        Figures.fixed(place.share(fret) * PERCENT, 1) + "\u00a0%",
        over ? "" : Figures.fixed(MagnetPull.share(place, fret) * PERCENT, 0) + "\u00a0%",
        over
            ? texts.say("pickups.over")
            : unheard.isEmpty() ? texts.say("pickups.all-heard") : unheard);
  }

  /** Shows the log of heights, the newest first. */
  void log(List<HeightRow> rows) {
    heights.getChildren().clear();
    if (rows.isEmpty()) {
      heights.getChildren().add(sentence(texts.say("pickups.no-heights")));
      return;
    }
    FigureTable table =
        new FigureTable(Column.WORDS, Column.SENTENCE, Column.FIGURE, Column.FIGURE);
    table.head(
        texts.say("pickups.day"),
        texts.say("pickups.name"),
        texts.say("pickups.treble-short"),
        texts.say("pickups.bass-short"));
    for (HeightRow row : rows) {
      String what =
          row.ticket() == 0
              ? row.pickup()
              : texts.say(
                  "pickups.check", Integer.toString(row.ticket()), Integer.toString(row.string()));
      table.row(Days.full(row.day()), what, length(row.trebleMm()), length(row.bassMm()));
    }
    heights.getChildren().add(table);
  }

  private String length(@Nullable Double mm) {
    if (mm == null) {
      return "";
    }
    return unit == LengthUnit.MM
        ? Figures.fixed(mm, 2)
        : Figures.fixed(mm / LengthUnit.MM_PER_INCH, 3);
  }

  private static Label head(String text) {
    Label head = new Label(text);
    head.getStyleClass().add(Looks.PANEL_HEAD);
    return head;
  }

  private static Label sentence(String text) {
    Label label = new Label(text);
    label.getStyleClass().add(Looks.SENTENCE);
    wrap(label);
    return label;
  }

  private static void wrap(Label label) {
    label.setWrapText(true);
    label.setMinHeight(USE_PREF_SIZE);
  }
}
