package sillet.logbook.demo;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.wire.Construction;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.strings.Tuning;
import sillet.logbook.units.Pitch;

/**
 * Invented string sets, with gauges as they are usual in the trade (common practice, no source).
 */
final class DemoStrings {
  static final StringSet LIGHT_SIX =
      new StringSet(
          DemoPeople.id("set light six"),
          "Light six (demo)",
          List.of(plain(.010), plain(.013), plain(.017), steel(.026), steel(.036), steel(.046)));
  static final StringSet LONG_FOUR =
      new StringSet(
          DemoPeople.id("set long four"),
          "Long four (demo)",
          List.of(steel(.045), steel(.065), steel(.085), steel(.105)));
  static final StringSet ACOUSTIC_SIX =
      new StringSet(
          DemoPeople.id("set acoustic six"),
          "Acoustic light (demo)",
          List.of(
              plain(.012), plain(.016), bronze(.024), bronze(.032), bronze(.042), bronze(.053)));
  static final StringSet TWELVE =
      new StringSet(
          DemoPeople.id("set twelve"),
          "Twelve, octaves (demo)",
          List.of(
              plain(.010),
              plain(.010),
              plain(.013),
              plain(.013),
              plain(.017),
              plain(.008),
              steel(.026),
              plain(.012),
              steel(.036),
              plain(.018),
              steel(.046),
              steel(.026)));

  static final Tuning SIX = Tuning.of("E A D G B E", List.of("E4", "B3", "G3", "D3", "A2", "E2"));
  static final Tuning FOUR = Tuning.of("E A D G", List.of("G2", "D2", "A1", "E1"));
  static final Tuning COURSES =
      Tuning.of(
          "six courses with octaves",
          List.of("E4", "E4", "B3", "B3", "G3", "G4", "D3", "D4", "A2", "A3", "E2", "E3"));

  private DemoStrings() {}

  static List<StringSet> sets() {
    return List.of(LIGHT_SIX, LONG_FOUR, ACOUSTIC_SIX, TWELVE);
  }

  static List<FittedString> fitted(StringSet set, Tuning tuning, double scaleMm) {
    List<Pitch> pitches = tuning.at(Pitch.CONCERT_A4_HZ);
    List<FittedString> strings = new ArrayList<>();
    for (int i = 0; i < pitches.size(); i++) {
      strings.add(new FittedString(i + 1, pitches.get(i), scaleMm, set.strings().get(i)));
    }
    return strings;
  }

  private static StringMake plain(double gaugeIn) {
    return StringMake.of(gaugeIn, Construction.PLAIN_STEEL);
  }

  private static StringMake steel(double gaugeIn) {
    return StringMake.of(gaugeIn, Construction.WOUND_STEEL);
  }

  private static StringMake bronze(double gaugeIn) {
    return StringMake.of(gaugeIn, Construction.WOUND_BRONZE);
  }
}
