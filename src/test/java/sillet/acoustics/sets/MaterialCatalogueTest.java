package sillet.acoustics.sets;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import sillet.acoustics.wire.Material;

/** That what is listed and what is reckoned with agree. */
class MaterialCatalogueTest {

  @ParameterizedTest
  @EnumSource(Material.class)
  void everyMaterialHasASource(Material material) {
    assertThat(MaterialCatalogue.of(material)).isNotEmpty();
  }

  /** EN 10270-1 206 GPa and 7850 kg/m3 as an open spring table quotes it [S2]. */
  @Test
  void musicWireIsReckonedByTheStandard() {
    MaterialSource first = MaterialCatalogue.of(Material.MUSIC_WIRE).get(0);

    assertThat(first.source()).contains("EN 10270-1");
    assertThat(first.modulus())
        .isEqualTo(
            new MaterialSource.Span(
                Material.MUSIC_WIRE.modulus(0), Material.MUSIC_WIRE.modulus(0)));
    assertThat(first.density())
        .isEqualTo(
            new MaterialSource.Span(Material.MUSIC_WIRE.density(), Material.MUSIC_WIRE.density()));
  }

  /** The spread of references that the estimate of a string's stiffness carries: 8 %. */
  @Test
  void musicWireSpreadsByEightPercent() {
    double low = Double.POSITIVE_INFINITY;
    double high = 0;
    for (MaterialSource one : MaterialCatalogue.of(Material.MUSIC_WIRE)) {
      MaterialSource.Span modulus = one.modulus();
      if (modulus != null) {
        low = Math.min(low, modulus.low());
        high = Math.max(high, modulus.high());
      }
    }
    assertThat(high / low).isBetween(1.08, 1.10);
  }

  @Test
  void everySourceSaysSomething() {
    assertThat(MaterialCatalogue.sources())
        .allSatisfy(
            one -> {
              assertThat(one.source()).isNotBlank();
              assertThat(one.modulus() != null || one.density() != null).isTrue();
            });
  }
}
