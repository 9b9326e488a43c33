package sillet.acoustics.wire;

/** How a string is made. */
public enum Construction {
  /** Plain steel wire. */
  PLAIN_STEEL,
  /** Steel core, plated or stainless steel wrap. */
  WOUND_STEEL,
  /** Steel core, nickel wrap. */
  WOUND_NICKEL,
  /** Steel core, bronze wrap. */
  WOUND_BRONZE,
  /** Plain nylon. */
  PLAIN_NYLON,
  /** Plain fluorocarbon (PVDF). */
  PLAIN_FLUOROCARBON,
  /** Nylon filament core, metal wrap. */
  WOUND_NYLON,
  /** Plain gut. */
  PLAIN_GUT
}
