package sillet.acoustics.virtual;

import java.util.Arrays;

/**
 * One string on its instrument: what it is made of, what it lies on, who presses it, what is heard
 * of it. Every question names where saddle and nut stand, as setbacks from the saddle's nominal
 * place and from where the nut is; the open string is tuned first, always.
 */
public final class VirtualString {
  private final VirtualWire wire;
  private final VirtualNeck neck;
  private final Rest rest;
  private final Finger finger;
  private final Sound sound;

  /**
   * What a string rests on.
   *
   * @param nutHeight of the slot above the line from nut to body joint
   * @param saddleHeight above the same line
   * @param nutOffset how far the nut edge is out of place, away from the saddle
   * @param ends how it is held
   * @param slippingLength length beyond nut and saddle that stretches along
   * @param axialGive how far neck and bridge come nearer under one newton more, m/N
   * @param ramp rise of the saddle per metre it is moved back
   */
  record Rest(
      double nutHeight,
      double saddleHeight,
      double nutOffset,
      Ends ends,
      double slippingLength,
      double axialGive,
      double ramp) {
    Rest raised(double atNut, double atSaddle) {
      return new Rest(
          nutHeight + atNut,
          saddleHeight + atSaddle,
          nutOffset,
          ends,
          slippingLength,
          axialGive,
          ramp);
    }

    Rest nutAway(double by) {
      return new Rest(
          nutHeight, saddleHeight, nutOffset + by, ends, slippingLength, axialGive, ramp);
    }
  }

  /**
   * What it sounds like.
   *
   * @param openHz pitch heard of the open string
   * @param mix of partials that is heard
   * @param ripple of its mass
   */
  record Sound(double openHz, PartialMix mix, MassRipple ripple) {
    static Sound plain(double openHz) {
      return new Sound(openHz, PartialMix.FUNDAMENTAL, MassRipple.NONE);
    }
  }

  VirtualString(VirtualWire wire, VirtualNeck neck, Rest rest, Finger finger, Sound sound) {
    this.wire = wire;
    this.neck = neck;
    this.rest = rest;
    this.finger = finger;
    this.sound = sound;
  }

  VirtualString withSlotHigher(double by) {
    return new VirtualString(wire, neck, rest.raised(by, 0), finger, sound);
  }

  VirtualString withNutAway(double by) {
    return new VirtualString(wire, neck, rest.nutAway(by), finger, sound);
  }

  VirtualString withFretMoved(int fret, double by) {
    return new VirtualString(wire, neck.withFretMoved(fret, by), rest, finger, sound);
  }

  VirtualString withRipple(MassRipple ripple) {
    Sound uneven = new Sound(sound.openHz(), sound.mix(), ripple);
    return new VirtualString(wire, neck, rest, finger, uneven);
  }

  /** Another wire in its place, tuned to another pitch, its saddle raised. */
  VirtualString restrung(VirtualWire other, double openHz, double saddleHigher) {
    Sound fresh = new Sound(openHz, sound.mix(), MassRipple.NONE);
    return new VirtualString(other, neck, rest.raised(0, saddleHigher), finger, fresh);
  }

  /** Fretted note minus open string, in cents of the equal temperament. */
  public double centsAgainstOpen(int fret, double setback, double nutSetback) {
    return cents(fret, setback, nutSetback, sound.openHz());
  }

  /** Fretted note minus the harmonic over fret 12, an octave down. */
  public double centsAgainstHarmonic(int fret, double setback, double nutSetback) {
    double length = openLength(setback, nutSetback);
    double tension = openTension(length);
    double octave = heard(open(), tension, length, 2);
    return cents(fret, setback, nutSetback, octave / 2);
  }

  /** Clearance of the open string over a fret. */
  public double clearance(int fret) {
    double share = neck.x(fret) / neck.scale();
    double line = rest.nutHeight() + share * (rest.saddleHeight() - rest.nutHeight());
    return line - neck.y(fret);
  }

  /** Depth of the neck's bow, as a straightedge over frets 1 and 14 finds it. */
  public double relief() {
    return neck.relief();
  }

  private double cents(int fret, double setback, double nutSetback, double referenceHz) {
    double length = openLength(setback, nutSetback);
    TautPath before = nutToFinger(fret, setback, nutSetback);
    TautPath after = fingerToSaddle(fret, setback);
    double tension = stretched(openTension(length), length, before.length() + after.length());
    BeamString fretted = new BeamString(wire.bending(), rest.ends().fret(), rest.ends().saddle());
    double hz = heard(fretted, tension, after.lastStretch(), 1);
    return 1200 * Math.log(hz / referenceHz) / Math.log(2) - 100 * fret;
  }

  private BeamString open() {
    return new BeamString(wire.bending(), rest.ends().nut(), rest.ends().saddle());
  }

  /** What is heard differs from the first mode by a factor that hardly depends on the tension. */
  private double openTension(double length) {
    double first = sound.openHz();
    double tension = open().tension(first, wire::unitMass, length);
    if (!sound.equals(Sound.plain(sound.openHz()))) {
      for (int round = 0; round < 2; round++) {
        first *= sound.openHz() / heard(open(), tension, length, 1);
        tension = open().tension(first, wire::unitMass, length);
      }
    }
    return tension;
  }

  private double heard(BeamString string, double tension, double length, int mode) {
    double mass = wire.unitMass(tension);
    return sound
        .mix()
        .heard(q -> string.hz(tension, mass, length, q) * sound.ripple().factor(length, q), mode);
  }

  private double openLength(double setback, double nutSetback) {
    double rise = saddleHeight(setback) - rest.nutHeight();
    return Math.hypot(neck.scale() + setback + rest.nutOffset() + nutSetback, rise);
  }

  private double saddleHeight(double setback) {
    return rest.saddleHeight() + rest.ramp() * setback;
  }

  private double pressedAt(int fret) {
    return neck.x(fret) - finger.behind() * (neck.x(fret) - neck.x(fret - 1));
  }

  /** Below the straight line from the saddle over the fret, so that the string lies on its fret. */
  private double pressedTo(int fret, double setback) {
    double slope = (saddleHeight(setback) - neck.y(fret)) / (neck.scale() + setback - neck.x(fret));
    return neck.y(fret) - slope * (neck.x(fret) - pressedAt(fret)) - finger.depth();
  }

  /** From the nut over the frets the string may meet on its way down to the finger. */
  private TautPath nutToFinger(int fret, double setback, double nutSetback) {
    double[] x = neck.firstX(fret + 1);
    double[] y = neck.firstY(fret + 1);
    x[0] = -rest.nutOffset() - nutSetback;
    y[0] = rest.nutHeight();
    x[fret] = pressedAt(fret);
    y[fret] = pressedTo(fret, setback);
    return TautPath.over(x, y);
  }

  /** From the finger over its fret to the saddle; no fret on the way may be met. */
  private TautPath fingerToSaddle(int fret, double setback) {
    int last = VirtualNeck.FRETS - fret + 2;
    double[] x = new double[last + 1];
    double[] y = new double[last + 1];
    x[0] = pressedAt(fret);
    y[0] = pressedTo(fret, setback);
    for (int i = 1; i < last; i++) {
      x[i] = neck.x(fret + i - 1);
      y[i] = neck.y(fret + i - 1);
    }
    x[last] = neck.scale() + setback;
    y[last] = saddleHeight(setback);
    TautPath path = TautPath.over(x, y);
    if (path.lastContact() != neck.x(fret)) {
      throw new IllegalStateException("pressed at fret " + fret + " the string meets another fret");
    }
    return path;
  }

  /** Tension once the string is pressed: it lengthens, its rests come a little nearer. */
  private double stretched(double openTension, double openLength, double pathLength) {
    double slack = (openLength + rest.slippingLength()) / (1 + openTension / wire.axial());
    double stiffness = wire.axial() / slack;
    double longer = pathLength - openLength;
    return openTension + stiffness * longer / (1 + stiffness * rest.axialGive());
  }

  /** Root mean square of the cents over frets 1 to 12 against the open string. */
  public double rms(double setback, double nutSetback) {
    double[] cents = curve(setback, nutSetback);
    return Math.sqrt(Arrays.stream(cents).map(one -> one * one).sum() / cents.length);
  }

  /** Cents at frets 1 to 12 against the open string. */
  public double[] curve(double setback, double nutSetback) {
    double[] cents = new double[12];
    for (int fret = 1; fret <= cents.length; fret++) {
      cents[fret - 1] = centsAgainstOpen(fret, setback, nutSetback);
    }
    return cents;
  }
}
