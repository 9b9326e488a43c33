package sillet.sheets.bench;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.logbook.forecast.StringChange;
import sillet.logbook.plausible.Plausibility;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;

/** Reads what a string will be. */
final class ChangeCells {
  private static final Plausibility USUAL = new Plausibility(LengthUnit.MM);

  private ChangeCells() {}

  /** The change; checked against the string only where that could be read. */
  static StringChange read(Cells cells, @Nullable FittedString now) {
    Pitch pitch =
        cells.text(Columns.TO_PITCH).isEmpty() ? null : StringCells.pitch(cells, Columns.TO_PITCH);
    Double gaugeIn = cells.aboveZero(Columns.TO_GAUGE);
    Construction construction =
        cells.text(Columns.TO_CONSTRUCTION).isEmpty()
            ? null
            : StringCells.construction(cells, Columns.TO_CONSTRUCTION);
    Double coreIn = cells.aboveZero(Columns.TO_CORE);
    Double unitMass = cells.aboveZero(Columns.TO_UNIT_MASS);
    Double action12Mm = cells.number(Columns.TO_ACTION_12);
    if (gaugeIn != null) {
      cells.warn(Columns.TO_GAUGE, USUAL.gaugeIn(gaugeIn));
    }
    if (action12Mm != null) {
      cells.warn(Columns.TO_ACTION_12, USUAL.actionMm(action12Mm));
    }
    int number = now == null ? 1 : now.number();
    StringChange change =
        new StringChange(number, pitch, gaugeIn, construction, coreIn, unitMass, action12Mm);
    if (now != null) {
      check(cells, change, now);
    }
    return change;
  }

  private static void check(Cells cells, StringChange change, FittedString now) {
    try {
      StringMake then = change.make(now.make());
      if (!then.equals(now.make())) {
        cells.warn(Columns.TO_GAUGE, USUAL.plain(then));
      }
    } catch (Rejection rejection) {
      // each figure alone was right, so the core does not fit the gauge
      cells.refuse(Columns.TO_CORE, rejection.reason());
    }
  }
}
