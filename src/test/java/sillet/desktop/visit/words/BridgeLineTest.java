package sillet.desktop.visit.words;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.moves.BridgeAdvice;
import sillet.logbook.text.Texts;

class BridgeLineTest {
  private static BridgeLine line(SaddleKind kind, @Nullable Double... fromFront) {
    List<BridgeAdvice.StringLeft> left = new ArrayList<>();
    for (int i = 0; i < fromFront.length; i++) {
      left.add(new BridgeAdvice.StringLeft(i + 1, 0.4, 0.6, fromFront[i], true));
    }
    BridgeAdvice advice = new BridgeAdvice(0.42, -1.31, left, List.of());
    return BridgeLine.of(advice, kind, Texts.english());
  }

  @Test
  void saysWhereBothEndsGo() {
    assertThat(line(SaddleKind.FLOATING, (Double) null).ends())
        .isEqualTo("Treble end 0.42 mm away from neck, bass end 1.31 mm toward neck.");
    assertThat(line(SaddleKind.FLOATING, (Double) null).sentences()).isEmpty();
  }

  @Test
  void saysWhichThicknessHoldsThePointsWithAMargin() {
    // 3/32 in is 2.38 mm, 1/8 in 3.18 mm: usual thicknesses [P]; 0.4 mm kept: common practice
    assertThat(line(SaddleKind.ONE_PIECE, 0.5, 2.0).sentences().get(0)).contains("3/32 in");
    assertThat(line(SaddleKind.ONE_PIECE, 0.5, 2.0).sentences().get(0)).contains("is enough");
    assertThat(line(SaddleKind.ONE_PIECE, 0.5, 2.8).sentences().get(0))
        .contains("too thin, 1/8 in (3.2 mm) is enough");
    assertThat(line(SaddleKind.ONE_PIECE, 0.5, 3.2).sentences().get(0))
        .contains("1/8 in (3.2 mm) is too thin");
  }

  @Test
  void asksForTheRoomWhereItIsNotKnown() {
    assertThat(line(SaddleKind.ONE_PIECE, 0.5, null).sentences().get(0)).startsWith("Measure");
  }
}
