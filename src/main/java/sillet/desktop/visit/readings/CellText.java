package sillet.desktop.visit.readings;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.Decimal;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Tries;

/**
 * What is typed in a cell and what it means.
 *
 * @param typed the characters
 * @param tries what they say; null if the cell is empty or cannot be read
 * @param problem why it cannot be read; null if it can
 */
public record CellText(String typed, @Nullable Tries tries, @Nullable Message problem) {
  private static final double ONE_STEP_CENTS = 0.1;
  private static final int STEP_DECIMALS = 1;

  /**
   * Reads what is typed; an empty cell means nothing was read, and a divider at the end is the
   * start of the next try.
   */
  public static CellText of(String typed) {
    String begun = typed.replaceFirst("[\\s/]+$", "");
    if (begun.isBlank()) {
      return new CellText(typed, null, null);
    }
    try {
      return new CellText(typed, Tries.parse(begun), null);
    } catch (Rejection unreadable) {
      return new CellText(typed, null, unreadable.reason());
    }
  }

  /** True if there is something, right or wrong. */
  public boolean filled() {
    return !typed.isBlank();
  }

  /** The text with its last try moved by tenths of a cent; an empty cell starts at zero. */
  public String stepped(int tenths) {
    if (problem != null) {
      return typed;
    }
    List<Decimal> all = new ArrayList<>(tries == null ? List.of() : tries.cents());
    Decimal last = all.isEmpty() ? new Decimal(0, STEP_DECIMALS) : all.remove(all.size() - 1);
    int decimals = Math.max(STEP_DECIMALS, last.decimals());
    all.add(new Decimal(last.value() + tenths * ONE_STEP_CENTS, decimals));
    return asTyped(new Tries(all));
  }

  /** Tries as they stand in a cell that has the focus: one with its sign, several with spaces. */
  public static String asTyped(Tries tries) {
    List<String> parts = new ArrayList<>();
    for (Decimal one : tries.cents()) {
      String signed = Figures.signed(one.value(), one.decimals());
      parts.add(tries.cents().size() > 1 && signed.startsWith("+") ? signed.substring(1) : signed);
    }
    return String.join(" ", parts);
  }
}
