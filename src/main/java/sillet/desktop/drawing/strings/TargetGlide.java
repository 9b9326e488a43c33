package sillet.desktop.drawing.strings;

import javafx.animation.Interpolator;
import javafx.animation.KeyFrame;
import javafx.animation.KeyValue;
import javafx.animation.Timeline;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.util.Duration;
import org.jspecify.annotations.Nullable;

/** Lets saddle targets glide to a new place, the only motion of the program. */
final class TargetGlide {
  private static final Duration TIME = Duration.millis(120);

  private final DoubleProperty way = new SimpleDoubleProperty(1);
  private final Timeline timeline =
      new Timeline(
          new KeyFrame(Duration.ZERO, new KeyValue(way, 0)),
          new KeyFrame(TIME, new KeyValue(way, 1, Interpolator.EASE_BOTH)));

  private double[] from = {};
  private double[] to = {};

  /** Calls back whenever targets stand somewhere else. */
  TargetGlide(Runnable moved) {
    way.addListener((seen, before, after) -> moved.run());
  }

  /** Takes new targets; those that were shown before glide where that is wanted. */
  void retarget(StringsPicture picture, boolean glide) {
    double[] shown = new double[to.length];
    for (int row = 0; row < to.length; row++) {
      shown[row] = between(row);
    }
    timeline.stop();
    to = targets(picture);
    from = shown.length == to.length ? shown : to.clone();
    if (glide && differs()) {
      way.set(0); // the timeline sets it only at the next pulse, one frame too late
      timeline.playFromStart();
    } else {
      way.set(1);
    }
  }

  private static double[] targets(StringsPicture picture) {
    return picture.rows().stream()
        .mapToDouble(
            row -> {
              Double target = row.saddle() == null ? null : row.saddle().reachableMm();
              return target == null ? Double.NaN : target;
            })
        .toArray();
  }

  private boolean differs() {
    for (int row = 0; row < to.length; row++) {
      if (Math.abs(from[row] - to[row]) > 1e-9) {
        return true;
      }
    }
    return false;
  }

  private double between(int row) {
    return Double.isNaN(from[row]) ? to[row] : from[row] + (to[row] - from[row]) * way.get();
  }

  /** Where a row's target is drawn now; null where nothing is to do. */
  @Nullable Double shownMm(int row) {
    double place = between(row);
    return Double.isNaN(place) ? null : place;
  }
}
