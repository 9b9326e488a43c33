package sillet.acoustics.virtual;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class SetChangeTest {
  @ParameterizedTest
  @EnumSource(Kind.class)
  void newStringsPlayOnTheSameInstrument(Kind kind) {
    Luck luck = new Luck(2);
    Workshop workshop = new Workshop(luck, 0);
    for (int i = 0; i < 20; i++) {
      VirtualInstrument old = workshop.build(kind);
      SetChange change = SetChange.draw(luck);
      VirtualInstrument fresh = workshop.restring(old, change);
      for (int k = 0; k < old.strings().size(); k++) {
        VirtualString before = old.strings().get(k).string();
        VirtualString after = fresh.strings().get(k).string();
        double lower = 12 * Math.log(old.strings().get(k).plan().hz()) / Math.log(2);
        lower -= 12 * Math.log(fresh.strings().get(k).plan().hz()) / Math.log(2);
        assertThat(lower).isCloseTo(change.semitonesLower(), within(1e-9));
        assertThat(after.clearance(12) - before.clearance(12))
            .isCloseTo(change.higherAtTwelve(), within(2.5e-4));
        for (int fret = 1; fret <= 17; fret++) {
          assertThat(after.centsAgainstOpen(fret, 3e-3, 0)).isBetween(-60.0, 100.0);
        }
      }
    }
  }

  @ParameterizedTest
  @EnumSource(Kind.class)
  void aLooseStringIsStretchedSharperByTheFinger(Kind kind) {
    Luck luck = new Luck(4);
    Workshop workshop = new Workshop(luck, 0);
    double sharper = 0;
    for (int i = 0; i < 20; i++) {
      VirtualInstrument old = workshop.build(kind);
      VirtualInstrument loose = workshop.restring(old, new SetChange(1, 4, 0, true));
      for (int k = 0; k < old.strings().size(); k++) {
        sharper +=
            loose.strings().get(k).string().centsAgainstOpen(12, 0, 0)
                - old.strings().get(k).string().centsAgainstOpen(12, 0, 0);
      }
    }
    assertThat(sharper).isPositive();
  }
}
