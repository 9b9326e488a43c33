package sillet.acoustics.findings;

import java.util.List;

/** Looks for causes of one kind. */
interface CauseTrial {
  /**
   * The causes that stand out.
   *
   * @param neck with the causes found so far taken into account
   */
  List<Suspect> look(NeckCase notes, LinearNeck neck);
}
