package sillet.acoustics.virtual;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** What each fault does to the notes, by the plain rules of length. */
class FaultTest {
  private static final double PER_UNIT = 1200 / Math.log(2);

  private final VirtualInstrument sound = new Workshop(new Luck(3), 0).build(Kind.ELECTRIC);
  private final double scale = sound.neck().scale();

  @Test
  void aFarNutSharpensEveryFrettedNoteAlike() {
    VirtualInstrument far = sound.with(new Fault.NutPlace(1e-3));
    for (int string = 0; string < 6; string++) {
      for (int fret : new int[] {1, 5, 12}) {
        assertThat(change(far, string, fret))
            .isCloseTo(1e-3 * PER_UNIT / scale, within(0.1 * 1e-3 * PER_UNIT / scale));
      }
    }
  }

  @Test
  void aFretTowardTheBridgeSharpensItsOwnNoteAlone() {
    VirtualInstrument off = sound.with(new Fault.FretPlace(7, 4e-4, 4e-4));
    double plain = 4e-4 * PER_UNIT * Math.pow(2, 7 / 12.0) / scale;
    assertThat(change(off, 2, 7)).isCloseTo(plain, within(0.1 * plain));
    assertThat(change(off, 2, 5)).isZero();
    assertThat(change(off, 2, 12)).isCloseTo(0, within(0.01));
  }

  @Test
  void aSlantedFretTurnsItsSignAcrossTheBoard() {
    VirtualInstrument off = sound.with(new Fault.FretPlace(7, 4e-4, -4e-4));
    assertThat(change(off, 0, 7)).isGreaterThan(1);
    assertThat(change(off, 5, 7)).isLessThan(-1);
  }

  @Test
  void aHighSlotSharpensItsStringMostAtTheFirstFret() {
    VirtualInstrument high = sound.with(new Fault.HighSlot(2, 4.5e-4));
    assertThat(change(high, 2, 1)).isGreaterThan(2);
    assertThat(change(high, 2, 1)).isGreaterThan(2 * change(high, 2, 5));
    assertThat(change(high, 3, 1)).isZero();
    double gap = high.strings().get(2).string().clearance(1);
    assertThat(gap - sound.strings().get(2).string().clearance(1))
        .isCloseTo(4.5e-4 * Math.pow(2, -1 / 12.0), within(1e-6));
  }

  @Test
  void anUnevenStringKeepsItsOpenPitchAndLosesItsPattern() {
    VirtualInstrument uneven = sound.with(new Fault.UnevenString(1, 0.015, 0.4 * scale, 1));
    double least = 0;
    double most = 0;
    for (int fret = 1; fret <= 12; fret++) {
      assertThat(change(uneven, 0, fret)).isZero();
      least = Math.min(least, change(uneven, 1, fret));
      most = Math.max(most, change(uneven, 1, fret));
    }
    assertThat(most - least).isBetween(2.0, 30.0);
  }

  @ParameterizedTest
  @EnumSource(Mishap.class)
  void everyMishapIsHeardSomewhere(Mishap mishap) {
    Luck luck = new Luck(8);
    for (Kind kind : Kind.values()) {
      VirtualInstrument before = new Workshop(luck, 0).build(kind);
      VirtualInstrument after = before.with(mishap.draw(luck, before));
      double most = 0;
      for (int string = 0; string < before.strings().size(); string++) {
        for (int fret = 1; fret <= 17; fret++) {
          most = Math.max(most, Math.abs(change(before, after, string, fret)));
        }
      }
      assertThat(most).as(kind.name()).isBetween(0.5, 40.0);
    }
  }

  private double change(VirtualInstrument faulty, int string, int fret) {
    return change(sound, faulty, string, fret);
  }

  private static double change(
      VirtualInstrument before, VirtualInstrument after, int string, int fret) {
    return after.strings().get(string).string().centsAgainstOpen(fret, 0, 0)
        - before.strings().get(string).string().centsAgainstOpen(fret, 0, 0);
  }
}
