package sillet.acoustics.sets;

import static sillet.acoustics.sets.SourceMark.COMPUTED;
import static sillet.acoustics.sets.SourceMark.MEMORY;
import static sillet.acoustics.sets.SourceMark.QUOTED;
import static sillet.acoustics.sets.SourceMark.READ;
import static sillet.acoustics.wire.Material.BRONZE;
import static sillet.acoustics.wire.Material.FLUOROCARBON;
import static sillet.acoustics.wire.Material.GUT;
import static sillet.acoustics.wire.Material.MUSIC_WIRE;
import static sillet.acoustics.wire.Material.NICKEL;
import static sillet.acoustics.wire.Material.NYLON;
import static sillet.acoustics.wire.Material.STEEL_WRAP;

import java.util.List;
import sillet.acoustics.sets.MaterialSource.Span;
import sillet.acoustics.wire.Material;

/**
 * What strings are made of, source by source: several for one material where they disagree, so that
 * the spread shows. The figures that are reckoned with stand in {@link Material}; the music wire's
 * modulus spans 190 to 207 GPa between references, 8 %, and is to be taken with that spread.
 */
public final class MaterialCatalogue {

  private static final double GIGA = 1e9;

  private static final List<MaterialSource> SOURCES =
      List.of(
          new MaterialSource(
              MUSIC_WIRE,
              gpa(206, 206),
              one(7850),
              "EN 10270-1, table of spring steel wire",
              QUOTED),
          new MaterialSource(
              MUSIC_WIRE, gpa(190, 190), one(7800), "ASTM A228, materials database", READ),
          new MaterialSource(
              MUSIC_WIRE, gpa(207, 207), one(7860), "ASTM A228, spring-industry handbook", QUOTED),
          new MaterialSource(
              MUSIC_WIRE,
              gpa(193.1, 203.4),
              null,
              "Shigley, Mechanical Engineering Design, table 10-5, thick to thin wire",
              MEMORY),
          new MaterialSource(
              STEEL_WRAP, null, new Span(7850, 7900), "nickel-plated steel wrap", MEMORY),
          new MaterialSource(
              STEEL_WRAP, gpa(193, 193), one(7910), "stainless 302 wire, ASTM A313", QUOTED),
          new MaterialSource(
              STEEL_WRAP, gpa(200, 200), one(7750), "stainless 430, supplier sheet", READ),
          new MaterialSource(
              NICKEL,
              gpa(200, 200),
              one(8900),
              "pure nickel, university notes and data sheet",
              READ),
          new MaterialSource(
              BRONZE, gpa(110, 110), one(8800), "phosphor bronze C51000, materials database", READ),
          new MaterialSource(
              BRONZE, gpa(103, 103), one(8850), "phosphor bronze, spring table", QUOTED),
          new MaterialSource(
              BRONZE,
              gpa(110, 110),
              one(8500),
              "80/20 copper-zinc C24000, materials database",
              READ),
          new MaterialSource(
              NYLON,
              gpa(3.8, 9.1),
              null,
              "Anderson, Beausoleil, JASA 156 (2024), nylon at pitch",
              READ),
          new MaterialSource(
              NYLON, null, new Span(1070, 1140), "nylon monofilament, settled", MEMORY),
          new MaterialSource(
              NYLON,
              null,
              one(972),
              "fit to the table of Anderson, Beausoleil (2024), packet diameters",
              COMPUTED),
          new MaterialSource(
              FLUOROCARBON,
              gpa(5.5, 13.4),
              null,
              "Anderson, Beausoleil, JASA 156 (2024), fluorocarbon at pitch",
              READ),
          new MaterialSource(FLUOROCARBON, null, one(1780), "fluorocarbon (PVDF)", MEMORY),
          new MaterialSource(
              FLUOROCARBON,
              null,
              one(1610),
              "fit to the table of Anderson, Beausoleil (2024), packet diameters",
              COMPUTED),
          new MaterialSource(GUT, gpa(5, 6), one(1300), "gut, twisted", MEMORY));

  private MaterialCatalogue() {}

  /** Every source, by material; the one that is reckoned with comes first where it is one. */
  public static List<MaterialSource> sources() {
    return SOURCES;
  }

  /** The sources of one material. */
  public static List<MaterialSource> of(Material material) {
    return SOURCES.stream().filter(one -> one.material() == material).toList();
  }

  private static Span gpa(double low, double high) {
    return new Span(low * GIGA, high * GIGA);
  }

  private static Span one(double figure) {
    return new Span(figure, figure);
  }
}
