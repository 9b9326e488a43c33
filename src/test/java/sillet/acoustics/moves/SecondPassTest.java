package sillet.acoustics.moves;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The weighting is that of two independent normal figures: computed by hand, no source needed. */
class SecondPassTest {
  private static final double PREDICTED = -2690;

  @Test
  void weighsWhatWasSeenAgainstTheModelByTheirVariances() {
    // model: sd 0.02 x 2690 = 53.8. Seen: (0.4 - 5.0)/0.0018 = -2555.556 with
    // sd sqrt(0.1^2 + 0.1^2 + 0.269^2)/0.0018 = 168.839
    PassProof proof = SecondPass.combine(5.0, 0.1, 0.4, 0.1, 0.0018, PREDICTED);

    double model = 1 / (53.8 * 53.8);
    double seen = 1 / (168.839 * 168.839);
    assertThat(proof.combinedCentsPerMetre())
        .isCloseTo((model * PREDICTED + seen * -2555.556) / (model + seen), within(0.01));
    assertThat(proof.sd()).isCloseTo(1 / Math.sqrt(model + seen), within(0.01));
    assertThat(proof.nextMove()).isCloseTo(0.4 / 2677.60, within(1e-8));
    assertThat(proof.withinOneCent()).isTrue();
    assertThat(proof.notAsPredicted()).isFalse();
  }

  @Test
  void aNoisyPassDoesNotSpoilTheModel() {
    Random random = new Random(11);
    for (int round = 0; round < 5000; round++) {
      double move = 0.0004 * random.nextGaussian();
      double before = 5 * random.nextGaussian();
      double after = before + PREDICTED * move + 2.8 * random.nextGaussian();
      PassProof proof = SecondPass.combine(before, 2, after, 2, move, PREDICTED);
      assertThat(proof.combinedCentsPerMetre()).isCloseTo(PREDICTED, within(0.02 * 2690));
      assertThat(proof.sd()).isLessThanOrEqualTo(0.02 * 2690 * (1 + 1e-9));
    }
  }

  @Test
  void learnsFromALargeMoveReadWell() {
    // truth: 3 % less than the model; read to 0.02 cents over 10 mm
    double truth = 0.97 * PREDICTED;
    PassProof proof = SecondPass.combine(26, 0.02, 26 + truth * 0.01, 0.02, 0.01, PREDICTED);

    assertThat(Math.abs(proof.combinedCentsPerMetre() - truth))
        .isLessThan(0.25 * Math.abs(PREDICTED - truth));
    assertThat(proof.notAsPredicted()).isFalse();
  }

  @Test
  void saysWhenTheStringDidNotDoAsPredicted() {
    // predicted 5.0 - 4.842 = 0.158 cents; sd of that sqrt(0.1^2 + 0.1^2 + 0.269^2 + 0.097^2) =
    // 0.319
    assertThat(SecondPass.combine(5, 0.1, 1.10, 0.1, 0.0018, PREDICTED).notAsPredicted()).isFalse();
    assertThat(SecondPass.combine(5, 0.1, 1.13, 0.1, 0.0018, PREDICTED).notAsPredicted()).isTrue();
  }

  @Test
  void keepsToTheModelAfterAMoveTheWrongWay() {
    PassProof proof = SecondPass.combine(5, 0.1, 18, 0.1, 0.005, PREDICTED);

    assertThat(proof.notAsPredicted()).isTrue();
    assertThat(proof.combinedCentsPerMetre()).isEqualTo(PREDICTED);
    assertThat(proof.nextMove()).isCloseTo(18 / 2690.0, within(1e-9));
  }

  @Test
  void learnsNothingWhereTheSaddleStayed() {
    PassProof proof = SecondPass.combine(1.2, 0.1, 1.3, 0.1, 0, PREDICTED);

    assertThat(proof.combinedCentsPerMetre()).isCloseTo(PREDICTED, within(1e-9));
    assertThat(proof.notAsPredicted()).isFalse();
    assertThat(proof.withinOneCent()).isFalse();
    assertThat(SecondPass.combine(1.2, 0.1, 2.3, 0.1, 0, PREDICTED).notAsPredicted()).isTrue();
  }

  @Test
  void holdsTheTrueNextMoveAsOftenAsItSays() {
    Random random = new Random(3);
    int held = 0;
    int strange = 0;
    int rounds = 4000;
    for (int round = 0; round < rounds; round++) {
      double truth = PREDICTED * (1 + 0.02 * random.nextGaussian());
      double error = 6 * random.nextGaussian();
      double before = error + 0.3 * random.nextGaussian();
      double move = -before / PREDICTED;
      error += truth * (move + 1e-4 * random.nextGaussian());
      double after = error + 0.3 * random.nextGaussian();
      PassProof proof = SecondPass.combine(before, 0.3, after, 0.3, move, PREDICTED);
      held += Math.abs(proof.nextMove() + error / truth) <= 1.96 * proof.nextSd() ? 1 : 0;
      strange += proof.notAsPredicted() ? 1 : 0;
    }
    assertThat(held / (double) rounds).isBetween(0.93, 0.98);
    assertThat(strange / (double) rounds).isLessThan(0.01);
  }

  @ParameterizedTest
  @CsvSource({
    "NaN, 0.1, 1, 0.1, 0.001, -2690", "5, 0, 1, 0.1, 0.001, -2690",
        "5, 0.1, NaN, 0.1, 0.001, -2690",
    "5, 0.1, 1, -1, 0.001, -2690", "5, 0.1, 1, 0.1, NaN, -2690", "5, 0.1, 1, 0.1, 0.001, 0",
    "5, 0.1, 1, 0.1, 0.001, NaN", "5, NaN, 1, 0.1, 0.001, -2690", "5, 0.1, 1, 0.1, Infinity, -2690"
  })
  void rejectsWhatIsNoPass(double a, double sdA, double b, double sdB, double move, double model) {
    assertThatThrownBy(() -> SecondPass.combine(a, sdA, b, sdB, move, model))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
