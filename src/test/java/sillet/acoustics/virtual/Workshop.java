package sillet.acoustics.virtual;

import java.util.ArrayList;
import java.util.List;

/**
 * Builds instruments by chance, each with its own faults. Where nothing was published the range is
 * chosen so that setbacks come out as benches see them: about 2 mm for a thin plain string, 3 to 6
 * for thick ones.
 */
public final class Workshop {
  private final Luck luck;
  private final double rampSd;

  /**
   * A workshop.
   *
   * @param rampSd standard deviation of the bridge plate's slope against the frets; 0 for bridges
   *     that lie true
   */
  public Workshop(Luck luck, double rampSd) {
    this.luck = luck;
    this.rampSd = rampSd;
  }

  public VirtualInstrument build(Kind kind) {
    Kind.Ranges ranges = kind.ranges();
    double scale = luck.millimetres(ranges.scale());
    VirtualNeck neck =
        VirtualNeck.bent(
            scale,
            luck.millimetres(ranges.relief()),
            luck.chance(0.5) ? 14 : 16,
            luck.normals(VirtualNeck.FRETS + 1, 3e-5),
            luck.normals(VirtualNeck.FRETS + 1, 1e-5));
    double action = luck.millimetres(ranges.actionAtTwelve());
    double gap = luck.millimetres(ranges.gapAtFirst());
    Ends ends = ends(kind);
    double ramp = luck.normal(0, rampSd);
    double nutOffset = luck.normal(0, 2e-4);
    WireMill mill = new WireMill(luck);
    List<VirtualInstrument.Course> strings = new ArrayList<>();
    for (StringPlan plan : kind.strings()) {
      WireMill.Drawn drawn = mill.draw(plan, kind, scale);
      double[] heights = heights(neck, action + luck.normal(0, 1e-4), gap + luck.normal(0, 3e-5));
      VirtualString.Rest rest =
          new VirtualString.Rest(
              heights[0],
              heights[1],
              nutOffset,
              ends,
              luck.between(0, 0.3) * luck.between(0.06, 0.25),
              1 / luck.between(3e6, 2e7),
              ramp);
      Finger finger = new Finger(luck.between(0.15, 0.5), luck.between(2e-5, 1.5e-4));
      VirtualString.Sound sound = new VirtualString.Sound(plan.hz(), mix(), MassRipple.NONE);
      VirtualString string = new VirtualString(drawn.wire(), neck, rest, finger, sound);
      strings.add(new VirtualInstrument.Course(plan, drawn, string));
    }
    return new VirtualInstrument(kind, neck, strings);
  }

  /** Other strings on an instrument; its neck, nut, bridge and whoever presses stay. */
  public VirtualInstrument restring(VirtualInstrument old, SetChange change) {
    WireMill mill = new WireMill(luck);
    List<StringPlan> usual = old.kind().strings();
    List<StringPlan> tuned = old.kind().strings(change.gaugeFactor(), change.semitonesLower());
    List<VirtualInstrument.Course> strings = new ArrayList<>();
    for (int i = 0; i < usual.size(); i++) {
      StringMake before = old.strings().get(i).drawn().make();
      StringMake make =
          change.sameMake()
              ? before.anotherGauge(luck)
              : StringMake.draw(luck, usual.get(i), old.kind());
      WireMill.Drawn drawn = mill.redraw(usual.get(i), tuned.get(i), make, old.neck().scale());
      double higherAtSaddle = 2 * (change.higherAtTwelve() + luck.normal(0, 8e-5));
      VirtualString string =
          old.strings().get(i).string().restrung(drawn.wire(), tuned.get(i).hz(), higherAtSaddle);
      strings.add(new VirtualInstrument.Course(tuned.get(i), drawn, string));
    }
    return new VirtualInstrument(old.kind(), old.neck(), strings);
  }

  /** A tuner that follows the first partial, with some of the next two in it. */
  private PartialMix mix() {
    return new PartialMix(luck.between(0, 0.2), luck.between(0, 0.1));
  }

  /** How strings are held: about one clamped end in all, 1 +- 0.2, and a bridge that yields. */
  private Ends ends(Kind kind) {
    double sum = luck.normal(1, 0.2);
    double fret = Math.min(sum, luck.between(0.75, 1));
    double saddle = Math.min(1, sum - fret);
    double nut = Math.max(0, Math.min(1, fret + luck.normal(0, 0.1)));
    return new Ends(
        StringEnd.firm(nut),
        StringEnd.firm(fret),
        new StringEnd(saddle, kind.soundboard() ? top() : plate()));
  }

  /** A bridge plate on solid wood: a stiff spring. */
  private StringEnd.Give plate() {
    double give = 1 / luck.between(1e6, 1e7);
    return omega -> give;
  }

  /**
   * A thin top: two damped resonances. The mass behind each is chosen so that notes stray from a
   * smooth curve as they do on a measured flat-top guitar (checked by a test).
   */
  private StringEnd.Give top() {
    double low = 2 * Math.PI * luck.between(90, 120);
    double high = 2 * Math.PI * luck.between(180, 260);
    double mass = luck.between(2, 5);
    double quality = luck.between(12, 25);
    return omega -> swing(omega, low, mass, quality) + swing(omega, high, mass, quality);
  }

  private static double swing(double omega, double own, double mass, double quality) {
    double off = own * own - omega * omega;
    double loss = omega * own / quality;
    return off / (mass * (off * off + loss * loss));
  }

  /** Heights at nut and saddle that leave these gaps over frets 12 and 1. */
  private static double[] heights(VirtualNeck neck, double action, double gap) {
    double atTwelve = neck.y(12) + action;
    double atFirst = neck.y(1) + gap;
    double slope = (atTwelve - atFirst) / (neck.x(12) - neck.x(1));
    double atNut = atFirst - slope * neck.x(1);
    return new double[] {atNut, atNut + slope * neck.scale()};
  }
}
