package sillet.logbook.instruments;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class NeckTest {
  @Test
  void givesFannedStringsTheirOwnScale() {
    Neck fanned = new Neck(8, 648, 711, 24, null, false);
    assertThat(fanned.scaleMm(1)).isEqualTo(648);
    assertThat(fanned.scaleMm(8)).isEqualTo(711);
    assertThat(fanned.scaleMm(4)).isEqualTo(675);
  }

  @Test
  void givesOneStringTheTrebleScale() {
    assertThat(new Neck(1, 900, 900, 0, null, false).scaleMm(1)).isEqualTo(900);
  }
}
