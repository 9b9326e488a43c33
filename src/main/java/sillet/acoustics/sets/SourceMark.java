package sillet.acoustics.sets;

/** How well a figure is known to say what its source says. */
public enum SourceMark {
  /** Read in the source itself. */
  READ,
  /** Quoted from the source by another public text. */
  QUOTED,
  /** From memory, not checked. */
  MEMORY,
  /** Computed here from figures that were read. */
  COMPUTED
}
