package sillet.desktop.forecast;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import java.util.concurrent.TimeoutException;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;
import sillet.desktop.drawing.Picture;
import sillet.desktop.theme.Theme;
import sillet.logbook.forecast.InstrumentChange;
import sillet.logbook.forecast.InstrumentForecast;
import sillet.logbook.forecast.StringFeel;
import sillet.logbook.forecast.StringForecast;
import sillet.logbook.forecast.StringTension;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.Heights;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.moves.Verdict;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;
import sillet.logbook.visits.StringsOn;

/** Renders the page of a forecast with invented figures, to be looked at. */
class ForecastGalleryTest {
  private static final List<String> SIX =
      List.of("E4 .010", "B3 .013", "G3 .017", "D3 .026", "A2 .036", "E2 .046");

  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private static StringsOn on(List<String> strings) {
    List<FittedString> fitted = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      String[] parts = strings.get(i).split(" ", -1);
      double gauge = Double.parseDouble(parts[1]);
      Construction kind = gauge > 0.02 ? Construction.WOUND_NICKEL : Construction.PLAIN_STEEL;
      fitted.add(
          new FittedString(i + 1, Pitch.parse(parts[0], 440), 648, StringMake.of(gauge, kind)));
    }
    return new StringsOn("", null, "", 440, fitted);
  }

  /** Invented: the pictures are about the page, the figures about nothing. */
  private static InstrumentForecast invented(StringsOn on, InstrumentChange change) {
    List<StringForecast> strings = new ArrayList<>();
    for (FittedString string : on.strings()) {
      double now = 60 + 7 * string.number();
      double then = change.of(string.number()).pitch() == null ? now : now * 0.8;
      double mm = 0.3 * string.number() - 0.6;
      strings.add(
          new StringForecast(
              new BenchString(
                  "one",
                  string,
                  Heights.NOT_KNOWN,
                  SaddleRoom.NOT_KNOWN,
                  NoteReadings.of(Map.of())),
              string,
              new StringTension(now, then, 1, StringFeel.LIGHTER, StringFeel.SAME, 0.41),
              new MoveFigures(mm, mm - 0.4, mm + 0.4, null, null, 2.4 * mm, 1, 0, 1, 1, -2.7, 0),
              Math.abs(mm) < 0.1 ? Verdict.LEAVE : Verdict.MOVE,
              List.of(),
              List.of()));
    }
    return new InstrumentForecast(
        strings, 560, 480, List.of(), List.of(Message.of("visit.caution.tension")), List.of());
  }

  private static void draw(
      String name, List<String> strings, Theme theme, int percent, int width, int height)
      throws IOException {
    StringsOn on = on(strings);
    Picture seen =
        Picture.of(
            () -> {
              ForecastModel model = new ForecastModel(on, LengthUnit.MM, Texts.english());
              StringSet set =
                  new StringSet(
                      new UUID(0, 1),
                      "Heavy rounds",
                      on.strings().stream().map(FittedString::make).toList());
              model.semitones().typedProperty().set("-2");
              model.tune();
              return new ForecastPage(
                  "Ottersby Fieldfare, ticket 2417",
                  model,
                  List.of(set),
                  Texts.english(),
                  change -> invented(on, change));
            },
            theme,
            percent,
            width,
            height);
    seen.save("forecast-" + name);
    assertThat(seen.countOther(seen.colourAt(2, height - 3))).isGreaterThan(40_000);
  }

  @Test
  void drawsItsShapes() throws IOException {
    draw("6", SIX, Theme.LIGHT, 100, 1280, 750);
    draw("6-dark-150", SIX, Theme.DARK, 150, 1280, 1100);
    List<String> twelve = new ArrayList<>(SIX);
    twelve.addAll(SIX);
    draw("12-1920", twelve, Theme.LIGHT, 100, 1920, 1030);
  }
}
