package sillet.acoustics.stiff;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;
import sillet.acoustics.wire.StringConstants;

@DisplayName("bending of nylon strings as J. Woodhouse measured it, 2004 [S2]")
class MeasuredBendingTest {
  private static final double LENGTH = 0.650;

  static List<Row> derived() {
    return Tables.read("woodhouse-2004-derived.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("derived")
  @DisplayName("inharmonicity and bending length follow from tension and bending stiffness [D]")
  void followsFromTensionAndBendingStiffness(Row row) {
    Row string = measured(row.text("string"));
    double tension = string.number("tension_n");
    double bending = 1e-6 * string.number("bending_1e6");
    StringConstants constants =
        new StringConstants(1e-3 * string.number("unit_mass_g_m"), 0, bending, 0);
    assertThat(1e5 * Inharmonicity.of(constants, tension, LENGTH))
        .isCloseTo(row.number("inharmonicity_1e5"), withinPercentage(0.05));
    assertThat(1e3 * StiffString.bendingLength(bending, tension))
        .isCloseTo(row.number("bending_length_mm"), within(6e-4));
  }

  private static Row measured(String string) {
    return Tables.read("woodhouse-2004.csv").stream()
        .filter(row -> row.text("string").equals(string))
        .findFirst()
        .orElseThrow();
  }
}
