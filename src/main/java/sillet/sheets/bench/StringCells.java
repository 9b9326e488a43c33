package sillet.sheets.bench;

import java.util.Arrays;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.logbook.plausible.Plausibility;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;

/** Reads which string it is and how it is made. */
final class StringCells {
  private static final Pattern NUMBER = Pattern.compile("0{0,8}[1-9]\\d{0,5}");
  private static final Plausibility USUAL = new Plausibility(LengthUnit.MM);

  private StringCells() {}

  /** The string, or null if something about it was refused. */
  static @Nullable FittedString read(Cells cells) {
    Integer number = number(cells);
    Pitch pitch = pitch(cells, Columns.PITCH);
    Double scaleMm = required(cells, Columns.SCALE);
    StringMake make = make(cells);
    if (scaleMm != null) {
      cells.warn(Columns.SCALE, USUAL.scaleMm(scaleMm));
    }
    if (number == null || pitch == null || scaleMm == null || make == null) {
      return null;
    }
    return new FittedString(number, pitch, scaleMm, make);
  }

  private static @Nullable Integer number(Cells cells) {
    String text = cells.filled(Columns.STRING);
    if (text == null) {
      return null;
    }
    if (!NUMBER.matcher(text).matches()) {
      cells.refuse(Columns.STRING, Message.of("bench.string-number", Quoted.of(text)));
      return null;
    }
    return Integer.valueOf(text);
  }

  static @Nullable Pitch pitch(Cells cells, String name) {
    String text = cells.filled(name);
    if (text == null) {
      return null;
    }
    try {
      return Pitch.parse(text, Pitch.CONCERT_A4_HZ);
    } catch (Rejection rejection) {
      cells.refuse(name, rejection.reason());
      return null;
    }
  }

  private static @Nullable StringMake make(Cells cells) {
    Double gaugeIn = required(cells, Columns.GAUGE);
    Construction construction = construction(cells, Columns.CONSTRUCTION);
    Double coreIn = cells.aboveZero(Columns.CORE);
    Double unitMass = cells.aboveZero(Columns.UNIT_MASS);
    if (gaugeIn != null) {
      cells.warn(Columns.GAUGE, USUAL.gaugeIn(gaugeIn));
    }
    if (gaugeIn == null || construction == null) {
      return null;
    }
    try {
      StringMake make = new StringMake(gaugeIn, construction, coreIn, unitMass);
      cells.warn(Columns.GAUGE, USUAL.plain(make));
      return make;
    } catch (Rejection rejection) {
      // each figure alone was right, so the core does not fit the gauge
      cells.refuse(Columns.CORE, rejection.reason());
      return null;
    }
  }

  static @Nullable Construction construction(Cells cells, String name) {
    String text = cells.filled(name);
    if (text == null) {
      return null;
    }
    Construction found = ConstructionWords.find(text).orElse(null);
    if (found == null) {
      String words =
          Arrays.stream(Construction.values())
              .map(ConstructionWords::of)
              .collect(Collectors.joining(", "));
      cells.refuse(name, Message.of("bench.word-unknown", Quoted.of(text), words));
    }
    return found;
  }

  private static @Nullable Double required(Cells cells, String name) {
    return cells.filled(name) == null ? null : cells.aboveZero(name);
  }
}
