package sillet.desktop.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.UUID;
import org.junit.jupiter.api.Test;

class TrailTest {
  private final Trail trail = new Trail();

  @Test
  void leadsBackStepByStepAndEndsAtTheBench() {
    trail.to(new Place.Instruments());
    trail.to(new Place.AtVisit(7));

    assertThat(trail.back()).isEqualTo(new Place.Instruments());
    assertThat(trail.back()).isEqualTo(new Place.Bench());
    assertThat(trail.back()).isEqualTo(new Place.Bench());
  }

  @Test
  void countsNoStepWhereOneStaysWhereOneIs() {
    trail.to(new Place.Instruments());
    trail.to(new Place.Instruments());

    assertThat(trail.back()).isEqualTo(new Place.Bench());
  }

  @Test
  void neverLeadsBackIntoTakingIn() {
    trail.to(new Place.TakeIn(UUID.randomUUID()));
    trail.to(new Place.AtVisit(7));

    assertThat(trail.back()).isEqualTo(new Place.Bench());
  }

  @Test
  void knowsUnderWhichWordAPlaceStands() {
    assertThat(new Place.AtVisit(1).word()).isEqualTo(Place.Word.BENCH);
    assertThat(new Place.TakeIn(null).word()).isEqualTo(Place.Word.BENCH);
    assertThat(new Place.History(UUID.randomUUID()).word()).isEqualTo(Place.Word.INSTRUMENTS);
    assertThat(new Place.ShopPlace().word()).isEqualTo(Place.Word.SHOP);
  }
}
