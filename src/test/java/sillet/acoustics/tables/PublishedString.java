package sillet.acoustics.tables;

import java.util.List;
import java.util.Map;

/** One string of the 2024 table, in SI units; see setbacks-2024.csv for its source. */
public record PublishedString(Row row) {

  public static final double SCALE = 0.650;
  public static final double AT_NUT = 1e-3;
  public static final double RISE = 4e-3;

  private static final Map<String, Integer> MIDI =
      Map.of("E4", 64, "B3", 59, "G3", 55, "D3", 50, "A2", 45, "E2", 40);

  public static List<PublishedString> all() {
    return Tables.read("setbacks-2024.csv").stream().map(PublishedString::new).toList();
  }

  public static double hz(String note) {
    return Notes.hz(MIDI.get(note));
  }

  public double hz() {
    return hz(row.text("note"));
  }

  public double radius() {
    return row.number("radius_mm") * 1e-3;
  }

  public double unitMass() {
    return row.number("unit_mass_g_m") * 1e-3;
  }

  public double tension() {
    return row.number("tension_n");
  }

  public double kappa() {
    return row.number("kappa");
  }

  public double beta() {
    return row.number("beta");
  }

  public double saddleMm() {
    return row.number("saddle_mm");
  }

  public double nutMm() {
    return row.number("nut_mm");
  }

  public int number() {
    return (int) row.number("string");
  }

  public String set() {
    return row.text("set");
  }

  @Override
  public String toString() {
    return row.toString();
  }
}
