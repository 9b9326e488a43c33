package sillet.acoustics.sets;

import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Material;

/**
 * What one source says of a material of strings.
 *
 * @param material what it is about
 * @param modulus Young's modulus in Pa; null where the source gives none
 * @param density in kg/m3; null where it gives none
 * @param source book, standard or paper, in English
 * @param mark how well that is known
 */
public record MaterialSource(
    Material material,
    @Nullable Span modulus,
    @Nullable Span density,
    String source,
    SourceMark mark) {

  /**
   * From where to where a figure goes.
   *
   * @param low the lowest the source gives
   * @param high the highest; the same where it gives one figure
   */
  public record Span(double low, double high) {}
}
