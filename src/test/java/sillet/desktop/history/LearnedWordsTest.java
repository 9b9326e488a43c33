package sillet.desktop.history;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.logbook.learned.LearnedFigure;
import sillet.logbook.learned.LearnedFret;
import sillet.logbook.learned.LearnedInstrument;
import sillet.logbook.learned.LearnedString;
import sillet.logbook.text.Texts;

class LearnedWordsTest {
  private static LearnedWords words(LearnedFigure nut, LearnedFret... frets) {
    LearnedFigure usual = new LearnedFigure(1, 0.9, 1.1);
    LearnedString string = new LearnedString(1, usual, new LearnedFigure(0.42, 0.37, 0.47), 3);
    return new LearnedWords(
        Texts.english(),
        new LearnedInstrument(List.of(string), nut, List.of(frets), usual, 3, 2, null));
  }

  @Test
  void saysFromHowMuchItWasLearned() {
    assertThat(words(new LearnedFigure(0, -0.1, 0.1)).from()).contains("3 passes in 2 visits");
  }

  @Test
  void namesANutOnlyWhereItsIntervalLeavesTheNominalPlaceOut() {
    assertThat(words(new LearnedFigure(0.1, -0.1, 0.3)).shared().get(0))
        .startsWith("The nut stands where it should");
    assertThat(words(new LearnedFigure(0.4, 0.2, 0.6)).shared().get(0))
        .contains("0.40 mm nearer to the frets", "0.20 to 0.60");
    assertThat(words(new LearnedFigure(-0.4, -0.6, -0.2)).shared().get(0))
        .contains("0.40 mm farther from the frets");
  }

  @Test
  void saysWhichWayAFretIsOff() {
    LearnedFret seven = new LearnedFret(7, new LearnedFigure(-0.3, -0.4, -0.2));
    assertThat(words(new LearnedFigure(0, -0.1, 0.1), seven).shared())
        .anyMatch(said -> said.startsWith("Fret 7 lies 0.30 mm toward the nut"));
  }

  @Test
  void givesEachStringItsFiguresWithTheirInterval() {
    assertThat(words(new LearnedFigure(0, -0.1, 0.1)).rows())
        .containsExactly(
            new LearnedWords.Row("1", "1.00 (0.90 to 1.10)", "0.42 (0.37 to 0.47)", "3"));
  }
}
