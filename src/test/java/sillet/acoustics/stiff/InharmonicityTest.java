package sillet.acoustics.stiff;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.DisplayName;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.tables.Notes;
import sillet.acoustics.tables.Row;
import sillet.acoustics.tables.Tables;
import sillet.acoustics.wire.StringConstants;

@DisplayName("V13-V20: inharmonicity")
class InharmonicityTest {

  private static final double INCH = 0.0254;
  private static final double MODULUS = 200e9;
  private static final double DENSITY = 7850;

  static List<Row> plainSteel() {
    return Tables.read("hjerrild-2019-plain-steel.csv");
  }

  static List<Row> growth() {
    return Tables.read("hjerrild-2019-growth.csv");
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource("plainSteel")
  @DisplayName("V13, V14, V15 inharmonicity of plain steel as measured")
  void comesNearTheMeasuredStrings(Row row) {
    double diameter = row.number("gauge_in") * INCH;
    double length = row.number("length_mm") * 1e-3;
    double hz = Notes.hz((int) row.number("midi"));
    double unitMass = DENSITY * Math.PI * diameter * diameter / 4;
    double tension = unitMass * 4 * length * length * hz * hz;
    double b = 1e5 * Inharmonicity.fletcher(MODULUS, diameter, tension, length);
    assertThat(b).isCloseTo(row.number("measured_1e5"), withinPercentage(5));
    assertThat(b).isCloseTo(row.number("formula_1e5"), withinPercentage(0.5));
  }

  @ParameterizedTest(name = "string {0}")
  @MethodSource("growth")
  @DisplayName("V16 inharmonicity grows as 2^(n/6)")
  void growsUpTheNeck(Row row) {
    double expected = Inharmonicity.atFret(row.number("open_1e5"), 12);
    assertThat(expected).isEqualTo(4 * row.number("open_1e5"));
    assertThat(row.number("twelve_1e5")).isCloseTo(expected, withinPercentage(7));
  }

  /** J. A. Kemp, SN Applied Sciences 2, 636 (2020), abstract [S]. */
  @Test
  @DisplayName("V17 a bass string, 100 cents at partial 10 over fret 12, at partial 6 over fret 21")
  void agreesWithTheBassStatement() {
    double atTwelve = Inharmonicity.fromSharpness(100, 10);
    assertThat(atTwelve).isCloseTo(1.2385e-3, within(1e-7));
    double atTwentyOne = Inharmonicity.atFret(atTwelve, 9);
    assertThat(Inharmonicity.partialSharpness(atTwentyOne, 6)).isCloseTo(100, within(2.0));
    assertThat(Inharmonicity.partialSharpness(atTwentyOne, 6)).isCloseTo(99.78, within(0.01));
  }

  /** R. W. Young, J. Acoust. Soc. Am. 24, 267 (1952), from memory [M]: 3.4e13 with cm. */
  @Test
  @DisplayName("V18 Young's constant [M]")
  void hasYoungsConstant() {
    double squareCentimetres = 1e4 * Inharmonicity.youngConstant(MODULUS, DENSITY);
    assertThat(squareCentimetres).isCloseTo(3.4e13, withinPercentage(0.5));
  }

  @Test
  @DisplayName("V18 Young's constant is Fletcher's formula in cents (derived)")
  void agreesWithYoungOnThePartials() {
    Wire wire = new Wire(new Random(5));
    double b = wire.fletcher();
    double lengthFourth = Math.pow(wire.length, 4);
    double cents =
        Inharmonicity.youngConstant(wire.modulus, wire.density)
            * 9
            * wire.diameter
            * wire.diameter
            / (wire.hz() * wire.hz() * lengthFourth);
    assertThat(cents).isCloseTo(600 / Math.log(2) * b * 9, withinPercentage(1e-9));
  }

  /** R. P. Feynman, letter of 1961, Physics Today 62(12), 46 (2009) [S]. */
  @Test
  @DisplayName("V19 Feynman = Fletcher")
  void agreesWithFeynman() {
    Random random = new Random(19);
    for (int i = 0; i < 200; i++) {
      Wire wire = new Wire(random);
      double feynman =
          Inharmonicity.feynman(
              wire.modulus, wire.area(), wire.unitMass(), wire.hz(), wire.tension);
      assertThat(feynman / wire.fletcher()).isCloseTo(1, within(1e-12));
    }
  }

  /** J. Beauchamp on the AUDITORY list (2005), quoting Rossing [S]. */
  @Test
  @DisplayName("V20 Rossing's A is half of it")
  void agreesWithRossing() {
    Random random = new Random(20);
    for (int i = 0; i < 200; i++) {
      Wire wire = new Wire(random);
      double rossing =
          Inharmonicity.rossing(wire.modulus, wire.diameter / 2, wire.tension, wire.length);
      assertThat(2 * rossing / wire.fletcher()).isCloseTo(1, within(1e-12));
    }
  }

  @Test
  void isOneFormulaForStringsAndWires() {
    Wire wire = new Wire(new Random(1));
    double bending = wire.modulus * Math.PI * Math.pow(wire.diameter, 4) / 64;
    StringConstants string = new StringConstants(wire.unitMass(), 1, bending, 0);
    assertThat(Inharmonicity.of(string, wire.tension, wire.length) / wire.fletcher())
        .isCloseTo(1, within(1e-12));
  }

  /** Rule laid down with the model [D]: 2597 B cents, 0.3 at 1.2e-4 and 0.8 at 3e-4. */
  @Test
  @DisplayName("the harmonic over fret 12 stands 1.5 C B above twice the open string (derived)")
  void raisesTheHarmonic() {
    assertThat(Inharmonicity.harmonicAgainstTwiceOpen(1.2e-4)).isCloseTo(0.3, within(0.05));
    assertThat(Inharmonicity.harmonicAgainstTwiceOpen(3e-4)).isCloseTo(0.8, within(0.05));
    assertThat(Inharmonicity.harmonicAgainstTwiceOpen(1e-5)).isCloseTo(0.02597, within(1e-5));
  }

  /** Guitars A and B of the 2019 data at 85 and 115 N, length assumed: .484 and .489 mm [D]. */
  @Test
  void findsThePlausibleCoreOfALowString() {
    assertThat(1e3 * Inharmonicity.coreFrom(15.811e-5, MODULUS, 85, 0.62865))
        .isCloseTo(0.484, within(0.005));
    assertThat(1e3 * Inharmonicity.coreFrom(11.653e-5, MODULUS, 115, 0.6452))
        .isCloseTo(0.489, within(0.005));
  }

  @Test
  void findsTheDiameterThatMadeTheInharmonicity() {
    Wire wire = new Wire(new Random(2));
    double core = Inharmonicity.coreFrom(wire.fletcher(), wire.modulus, wire.tension, wire.length);
    assertThat(core / wire.diameter).isCloseTo(1, within(1e-12));
  }

  /** Any round wire within wide limits. */
  private static final class Wire {
    final double modulus;
    final double density;
    final double diameter;
    final double length;
    final double tension;

    Wire(Random random) {
      modulus = 2e9 + random.nextDouble() * 2e11;
      density = 900 + random.nextDouble() * 8000;
      diameter = 1e-4 + random.nextDouble() * 2e-3;
      length = 0.2 + random.nextDouble();
      tension = 10 + random.nextDouble() * 200;
    }

    double area() {
      return Math.PI * diameter * diameter / 4;
    }

    double unitMass() {
      return density * area();
    }

    double hz() {
      return Math.sqrt(tension / unitMass()) / (2 * length);
    }

    double fletcher() {
      return Inharmonicity.fletcher(modulus, diameter, tension, length);
    }
  }
}
