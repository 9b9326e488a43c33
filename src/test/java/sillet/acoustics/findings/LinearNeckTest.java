package sillet.acoustics.findings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;
import org.junit.jupiter.api.Test;
import sillet.acoustics.findings.LinearNeck.Amount;

/** Against generalised least squares written out with the whole covariance [D]. */
class LinearNeckTest {
  private static final int ROWS = 12;
  private static final int UNKNOWNS = 5;

  private final Random random = new Random(3);
  private final double[] misfit = draw(ROWS);
  private final double[] sd = random.doubles(ROWS, 0.3, 1).toArray();
  private final double[][] slopes = drawSlopes();
  private final LinearNeck neck = new LinearNeck(misfit, sd, slopes);

  @Test
  void weighsACauseAgainstEverythingUnknown() {
    double[] shape = draw(ROWS);
    RealVector pull = inverse(slopes).operate(MatrixUtils.createRealVector(misfit));
    RealVector column = MatrixUtils.createRealVector(shape);
    double information = column.dotProduct(inverse(slopes).operate(column));
    Amount amount = neck.amount(shape);
    assertThat(amount.value()).isCloseTo(column.dotProduct(pull) / information, within(1e-9));
    assertThat(amount.sd()).isCloseTo(1 / Math.sqrt(information), within(1e-9));
    assertThat(amount.gain()).isCloseTo(Math.pow(amount.value() / amount.sd(), 2), within(1e-9));
  }

  @Test
  void leavesOneRowOut() {
    double[] unit = new double[ROWS];
    unit[4] = 1;
    assertThat(neck.alone(4).value()).isCloseTo(neck.amount(unit).value(), within(1e-9));
    assertThat(neck.alone(4).sd()).isCloseTo(neck.amount(unit).sd(), within(1e-9));
  }

  @Test
  void findsTwoCausesAtOnce() {
    double[] one = draw(ROWS);
    double[] other = draw(ROWS);
    double[] made = new double[ROWS];
    for (int i = 0; i < ROWS; i++) {
      made[i] = 2 * one[i] - 3 * other[i];
    }
    LinearNeck exact = new LinearNeck(made, sd, slopes);
    Pair pair = Pair.of(exact, exact.trace(one), exact.trace(other));
    assertThat(pair.first().value()).isCloseTo(2, within(1e-9));
    assertThat(pair.second().value()).isCloseTo(-3, within(1e-9));
  }

  @Test
  void losesACauseOnceItIsTakenIntoAccount() {
    double[] shape = draw(ROWS);
    double[] made = shape.clone();
    LinearNeck exact = new LinearNeck(made, sd, slopes);
    assertThat(exact.amount(shape).value()).isCloseTo(1, within(1e-9));
    assertThat(exact.with(shape).amount(draw(ROWS)).value()).isCloseTo(0, within(1e-2));
  }

  @Test
  void leavesResidualsOfTheMostLikelyPoint() {
    RealMatrix matrix = MatrixUtils.createRealMatrix(slopes);
    RealVector pull = inverse(slopes).operate(MatrixUtils.createRealVector(misfit));
    RealVector point = matrix.transpose().operate(pull);
    RealVector left = MatrixUtils.createRealVector(misfit).subtract(matrix.operate(point));
    for (int row = 0; row < ROWS; row++) {
      assertThat(neck.residual(row)).isCloseTo(left.getEntry(row), within(1e-9));
    }
  }

  private RealMatrix inverse(double[][] by) {
    RealMatrix matrix = MatrixUtils.createRealMatrix(by);
    RealMatrix covariance = matrix.multiplyTransposed(matrix);
    for (int i = 0; i < ROWS; i++) {
      covariance.addToEntry(i, i, sd[i] * sd[i]);
    }
    return new LUDecomposition(covariance).getSolver().getInverse();
  }

  private double[][] drawSlopes() {
    double[][] drawn = new double[ROWS][];
    for (int i = 0; i < ROWS; i++) {
      drawn[i] = draw(UNKNOWNS);
    }
    return drawn;
  }

  private double[] draw(int count) {
    double[] drawn = new double[count];
    for (int i = 0; i < count; i++) {
      drawn[i] = random.nextGaussian();
    }
    return drawn;
  }
}
