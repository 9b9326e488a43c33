package sillet.logbook.visits;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.strings.FittedString;

/** The strings of a visit as they lay and were read in each of its passes. */
final class VisitStrings {
  private final VisitRecord record;
  private final PassReadings readings;

  VisitStrings(VisitRecord record) {
    this.record = record;
    this.readings = new PassReadings(record.readings());
  }

  VisitRecord record() {
    return record;
  }

  /** The newest pass with anything read or moved; at least 1. */
  int lastPass() {
    return readings.lastPass(record.moves());
  }

  /** String 1 first; a string has no readings in a pass in which it was not read. */
  List<BenchString> in(int pass) {
    StringHeights heights =
        pass == 1 ? StringHeights.received(record.checks()) : StringHeights.left(record.checks());
    List<BenchString> bench = new ArrayList<>();
    for (FittedString string : record.visit().strings().strings()) {
      int number = string.number();
      bench.add(
          new BenchString(
              record.instrument().name(),
              string,
              heights.of(number),
              room(pass, number),
              readings.of(pass, number)));
    }
    return bench;
  }

  private SaddleRoom room(int pass, int string) {
    double movedMm = movedMm(string, 1, pass);
    var saddle = record.instrument().saddle();
    Double backMm = null;
    Double forwardMm = null;
    for (Travel travel : record.visit().travel()) {
      if (travel.string() == string) {
        backMm = shifted(travel.backMm(), -movedMm);
        forwardMm = shifted(travel.forwardMm(), movedMm);
      }
    }
    return new SaddleRoom(
        saddle.screwPitchMm(),
        backMm,
        forwardMm,
        saddle.kind(),
        saddle.thicknessMm(),
        record.aim().nut());
  }

  private static @Nullable Double shifted(@Nullable Double room, double byMm) {
    return room == null ? null : Math.max(0, room + byMm);
  }

  /** What the saddle of a string was moved after the passes from one up to but not another. */
  double movedMm(int string, int fromPass, int beforePass) {
    return record.moves().stream()
        .filter(m -> m.string() == string && m.pass() >= fromPass && m.pass() < beforePass)
        .mapToDouble(MadeMove::saddleMm)
        .sum();
  }

  /** The same of the nut, positive toward the bridge. */
  double nutMovedMm(int string, int fromPass, int beforePass) {
    double movedMm = 0;
    for (MadeMove move : record.moves()) {
      Double nut = move.nutMm();
      boolean meant = move.pass() >= fromPass && move.pass() < beforePass;
      if (move.string() == string && meant && nut != null) {
        movedMm += nut;
      }
    }
    return movedMm;
  }

  /** What the saddle was moved after one pass; null if it was not. */
  @Nullable Double madeMm(int pass, int string) {
    boolean moved = record.moves().stream().anyMatch(m -> m.pass() == pass && m.string() == string);
    return moved ? Double.valueOf(movedMm(string, pass, pass + 1)) : null;
  }
}
