package sillet.logbook.units;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class FiguresTest {
  @Test
  void writesNoMinusZeroAndNoPowersOfTen() {
    assertThat(Figures.fixed(-0.0004, 3)).isEqualTo("0.000");
    assertThat(Figures.fixed(1e-7, 3)).isEqualTo("0.000");
    assertThat(Figures.fixed(12_345_678.9, 2)).isEqualTo("12345678.90");
  }

  @Test
  void writesGaugesAsThePacketPrintsThem() {
    assertThat(Figures.gauge(0.010)).isEqualTo(".010");
    assertThat(Figures.gauge(0.046)).isEqualTo(".046");
    assertThat(Figures.gauge(0.0115)).isEqualTo(".0115");
  }

  @Test
  void writesSignedCentsWithATrueMinus() {
    assertThat(Figures.signed(5, 1)).isEqualTo("+5.0");
    assertThat(Figures.signed(-2.64, 1)).isEqualTo("\u22122.6");
    assertThat(Figures.signed(-0.01, 1)).isEqualTo("0.0");
  }
}
