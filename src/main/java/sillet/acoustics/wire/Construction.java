package sillet.acoustics.wire;

import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** How a string is built. */
public enum Construction {
  /** Bare music wire. */
  PLAIN_STEEL(Material.MUSIC_WIRE, null),
  /** Steel core under plated or stainless steel wrap. */
  WOUND_STEEL(Material.MUSIC_WIRE, Material.STEEL_WRAP),
  /** Steel core under pure nickel wrap. */
  WOUND_NICKEL(Material.MUSIC_WIRE, Material.NICKEL),
  /** Steel core under bronze wrap. */
  WOUND_BRONZE(Material.MUSIC_WIRE, Material.BRONZE),
  /** Nylon monofilament. */
  PLAIN_NYLON(Material.NYLON, null),
  /** Fluorocarbon monofilament. */
  PLAIN_FLUOROCARBON(Material.FLUOROCARBON, null),
  /** A bundle of nylon filaments under metal wrap. */
  WOUND_NYLON(Material.NYLON, Material.BRONZE),
  /** Twisted gut. */
  PLAIN_GUT(Material.GUT, null);

  private final Material carrier;
  private final @Nullable Material wrap;

  Construction(Material carrier, @Nullable Material wrap) {
    this.carrier = carrier;
    this.wrap = wrap;
  }

  /** What carries the tension: the whole string where it is plain, the core where it is wound. */
  public Material carrier() {
    return carrier;
  }

  /** What is wound around the core; empty where the string is plain. */
  public Optional<Material> wrap() {
    return Optional.ofNullable(wrap);
  }

  /** Whether there is a core and a winding. */
  public boolean wound() {
    return wrap != null;
  }

  /** Whether the tension hangs on steel. */
  public boolean steel() {
    return carrier == Material.MUSIC_WIRE;
  }
}
