package sillet.desktop.drawing.strings;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.Picture;

class TargetGlideTest {
  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  private static StringsPicture targetAt(double mm) {
    SaddleMark saddle = SaddleMark.at(1).within(-1, 7).to(mm, mm - 0.2, mm + 0.2);
    return picture(saddle);
  }

  private static StringsPicture picture(SaddleMark saddle) {
    return new StringsPicture(
        List.of(Samples.with(Samples.row(1, "E4", 0.010, 648), saddle)),
        StringsPicture.Board.of(22, List.of(12)),
        new Bridge.SingleSaddles("648.0"),
        Lie.USUAL,
        List.of(),
        OptionalDouble.empty());
  }

  @Test
  void aTargetGlidesFromItsOldPlaceToItsNewOne() throws InterruptedException {
    CountDownLatch there = new CountDownLatch(1);
    TargetGlide[] glide = new TargetGlide[1];
    Double first =
        Picture.onFxThread(
            () -> {
              glide[0] =
                  new TargetGlide(
                      () -> {
                        Double shown = glide[0].shownMm(0);
                        if (shown != null && shown == 5) {
                          there.countDown();
                        }
                      });
              glide[0].retarget(targetAt(2), false);
              glide[0].retarget(targetAt(5), true);
              return glide[0].shownMm(0);
            });
    assertThat(first).isLessThan(4);
    assertThat(there.await(10, TimeUnit.SECONDS)).isTrue();
  }

  @Test
  void withMotionOffItStandsThereAtOnce() {
    Double shown =
        Picture.onFxThread(
            () -> {
              TargetGlide glide = new TargetGlide(() -> {});
              glide.retarget(targetAt(2), false);
              glide.retarget(targetAt(5), false);
              return glide.shownMm(0);
            });
    assertThat(shown).isEqualTo(5);
  }

  @Test
  void whereNothingIsToDoThereIsNoTarget() {
    Double shown =
        Picture.onFxThread(
            () -> {
              TargetGlide glide = new TargetGlide(() -> {});
              glide.retarget(targetAt(2), false);
              glide.retarget(picture(SaddleMark.at(2)), true);
              return glide.shownMm(0);
            });
    assertThat(shown).isNull();
  }
}
