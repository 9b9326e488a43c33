package sillet.acoustics.estimate;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.neck.StringLie;
import sillet.acoustics.pitch.Cents;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.solve.NotSolved;
import sillet.acoustics.solve.Outcome;
import sillet.acoustics.solve.Solved;
import sillet.acoustics.wire.WireSpread;

/** Turns evidence into unknowns: which are shared by what, and how far each may be off. */
final class InstrumentModel {
  private final Unknowns unknowns = new Unknowns();
  private final List<OccasionModel> occasions = new ArrayList<>();
  private final List<OccasionModel> now = new ArrayList<>();

  private @Nullable Body body;

  private InstrumentModel() {}

  static Outcome<InstrumentModel> of(InstrumentEvidence evidence) {
    InstrumentModel model = new InstrumentModel();
    for (int string = 0; string < evidence.strings().size(); string++) {
      Outcome<OccasionModel> last = model.add(string, evidence.strings().get(string));
      if (last instanceof Solved<OccasionModel> solved) {
        model.now.add(solved.value());
      } else if (last instanceof NotSolved<OccasionModel> not) {
        return Outcome.notSolved(not.because());
      }
    }
    model.body = Body.of(model.unknowns, model.occasions);
    return Outcome.solved(model);
  }

  Unknowns unknowns() {
    return unknowns;
  }

  /** How the body makes notes stray. */
  Body body() {
    return Objects.requireNonNull(body);
  }

  /** Every occasion of every string, string by string. */
  List<OccasionModel> occasions() {
    return occasions;
  }

  /** The last occasion of each string. */
  List<OccasionModel> now() {
    return now;
  }

  /** Adds the body's slopes of a note; gives what it does to it at a point, cents. */
  double body(OccasionModel occasion, int fret, double[] point, double[] sds, double[] slopes) {
    body().chain(occasion.occasion().lie(), fret, sds, slopes);
    double cents = 0;
    for (int place : body().places()) {
      cents += slopes[place] * point[place];
    }
    return cents;
  }

  /** Where the frets lie at a point of the unknowns. */
  FretPlaces frets(double[] point, double[] sds) {
    double[] places = new double[FretReading.LAST_FRET + 1];
    for (int fret = 1; fret < places.length; fret++) {
      int place = unknowns.placeOfFret(fret);
      places[fret] = place < 0 ? 0 : sds[place] * point[place];
    }
    return FretPlaces.of(places);
  }

  private Outcome<OccasionModel> add(int string, StringHistory history) {
    Sum saddle = new Sum(0);
    Sum nut = new Sum(history.occasions().get(0).lie().nutSetback());
    nut.add(unknowns.place(Unknown.Kind.NUT, Unknown.SHARED, "", Expectations.NUT), 1);
    nut.add(unknowns.place(Unknown.Kind.SLOT, string, "", Expectations.SLOT), 1);
    boolean oneWire = history.occasions().stream().mapToInt(Occasion::wire).distinct().count() == 1;
    OccasionModel last = null;
    for (Occasion occasion : history.occasions()) {
      if (last != null && occasion.nutMoved() != 0) {
        nut = new Sum(nut);
        nut.expectMore(-occasion.nutMoved());
        int set = unknowns.place(Unknown.Kind.SLOT, string, occasion.pass(), Expectations.NUT_SET);
        nut.add(set, 1);
      }
      Sum[] sums = sums(string, occasion, oneWire);
      sums[Quantity.NUT.place()] = nut;
      if (last == null || occasion.saddleMoved().isEmpty()) {
        Outcome<Sum> free = freeSaddle(string, occasion, sums);
        if (free instanceof NotSolved<Sum> not) {
          return Outcome.notSolved(not.because());
        }
        saddle = free.orElseThrow();
      } else {
        saddle = moved(saddle, string, occasion);
      }
      sums[Quantity.SADDLE.place()] = saddle;
      last = new OccasionModel(string, occasion, sums);
      occasions.add(last);
      occasion.readings().stream().mapToInt(FretReading::fret).forEach(unknowns::fret);
    }
    return last == null ? Outcome.notSolved("nothing is known of a string") : Outcome.solved(last);
  }

  /** Around the place that is true at fret 12 if all else is as expected. */
  private Outcome<Sum> freeSaddle(int string, Occasion occasion, Sum[] sums) {
    sums[Quantity.SADDLE.place()] = new Sum(occasion.lie().saddleSetback());
    OccasionModel expected = new OccasionModel(string, occasion, sums);
    double[] quantities =
        expected.quantities(new double[unknowns.count()], new double[unknowns.count()]);
    return OctavePlace.of(expected.situation(quantities, FretPlaces.TRUE))
        .map(
            place -> {
              StringLie lie = occasion.lie();
              double sd = Expectations.SADDLE_CENTS * lie.scale() / Cents.PER_UNIT;
              Sum saddle = new Sum(place);
              saddle.add(unknowns.place(Unknown.Kind.SADDLE, string, occasion.pass(), sd), 1);
              return saddle;
            });
  }

  private Sum moved(Sum before, int string, Occasion occasion) {
    double move = occasion.saddleMoved().orElse(0);
    if (move == 0) {
      return before;
    }
    Sum after = new Sum(before);
    after.expectMore(move);
    double sd = Expectations.SADDLE_SET;
    after.add(unknowns.place(Unknown.Kind.SADDLE_SET, string, occasion.pass(), sd), 1);
    return after;
  }

  private Sum[] sums(int string, Occasion occasion, boolean oneWire) {
    Sum[] sums = new Sum[Quantity.COUNT];
    StringLie lie = occasion.lie();
    WireSpread spread = lie.constants().spread();
    Wire wire = new Wire(string, oneWire ? Integer.MIN_VALUE : occasion.wire());
    set(sums, Quantity.CORE, wire.sum(Unknown.Kind.CORE, spread.core()));
    set(sums, Quantity.MODULUS, wire.sum(Unknown.Kind.MODULUS, spread.modulus()));
    set(sums, Quantity.BENDING, wire.sum(Unknown.Kind.BENDING, spread.bending()));
    set(sums, Quantity.MASS, wire.sum(Unknown.Kind.MASS, spread.mass()));
    Sum press = new Sum(Math.log(Expectations.PRESS_METRES));
    press.add(shared(Unknown.Kind.PRESS, "", Expectations.PRESS), 1);
    press.add(unknowns.place(Unknown.Kind.PRESS, string, "", Expectations.PRESS_OWN), 1);
    set(sums, Quantity.PRESS, press);
    Sum after = new Sum(Math.log(Expectations.AFTER_SHARE));
    after.add(shared(Unknown.Kind.AFTER_LENGTH, "", Expectations.AFTER), 1);
    after.add(unknowns.place(Unknown.Kind.AFTER_LENGTH, string, "", Expectations.AFTER_OWN), 1);
    set(sums, Quantity.AFTER_LENGTH, after);
    Sum held = new Sum(lie.ends().fretted());
    held.add(shared(Unknown.Kind.HELD, "", Expectations.HELD), 1);
    set(sums, Quantity.HELD, held);
    Sum heldOpen = new Sum(lie.ends().open() - lie.ends().fretted());
    heldOpen.add(shared(Unknown.Kind.HELD_OPEN, "", Expectations.HELD_OPEN), 1);
    set(sums, Quantity.HELD_OPEN, heldOpen);
    heights(string, occasion, sums);
    return sums;
  }

  private void heights(int string, Occasion occasion, Sum[] sums) {
    HeightSds sds = occasion.heights();
    var typed = occasion.lie().clearances();
    set(
        sums,
        Quantity.ACTION,
        height(
            Unknown.Kind.ACTION,
            string,
            typed.atTwelve(),
            sds.atTwelve(),
            Expectations.ACTION_OWN));
    set(
        sums,
        Quantity.GAP,
        height(Unknown.Kind.GAP, string, typed.atFirst(), sds.atFirst(), Expectations.GAP_OWN));
    Sum relief = new Sum(typed.relief());
    relief.add(shared(Unknown.Kind.RELIEF, typed.relief(), sds.relief()), 1);
    set(sums, Quantity.RELIEF, relief);
  }

  /** The same figure again is the same measurement; a wide sd is mostly the instrument's. */
  private Sum height(Unknown.Kind kind, int string, double typed, double sd, double mostOwn) {
    double own = Math.min(sd, mostOwn);
    Sum height = new Sum(typed);
    height.add(unknowns.place(kind, string, typed, own), 1);
    double sharedSd = Math.sqrt(sd * sd - own * own);
    if (sharedSd > 0) {
      int place = shared(kind, "", sharedSd);
      height.add(place, sharedSd / unknowns.at(place).sd());
    }
    return height;
  }

  private int shared(Unknown.Kind kind, Object circumstance, double sd) {
    return unknowns.place(kind, Unknown.SHARED, circumstance, sd);
  }

  private static void set(Sum[] sums, Quantity quantity, Sum sum) {
    sums[quantity.place()] = sum;
  }

  /** A piece of string in its place: partly like the others that lay there. */
  private final class Wire {
    private final int string;
    private final int number;

    Wire(int string, int number) {
      this.string = string;
      this.number = number;
    }

    Sum sum(Unknown.Kind kind, double sd) {
      Sum sum = new Sum(0);
      if (sd == 0) {
        return sum;
      }
      if (number == Integer.MIN_VALUE) {
        sum.add(unknowns.place(kind, string, "", sd), 1);
        return sum;
      }
      double place = sd * Math.sqrt(Expectations.SAME_PLACE);
      double own = sd * Math.sqrt(1 - Expectations.SAME_PLACE);
      int atPlace = unknowns.place(kind, string, "", place);
      sum.add(atPlace, place / unknowns.at(atPlace).sd());
      sum.add(unknowns.place(kind, string, number, own), 1);
      return sum;
    }
  }
}
