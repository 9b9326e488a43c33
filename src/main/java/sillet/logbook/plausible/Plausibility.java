package sillet.logbook.plausible;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.wire.Construction;
import sillet.logbook.moves.BenchString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;
import sillet.logbook.units.LengthUnit;

/**
 * The usual spans of what is measured at the bench, wide enough for a raised nut or a baritone.
 * They follow from the target ranges the trade has published, widened; the limits themselves have
 * no source.
 *
 * @param unit the unit the figures were typed in; the other one is said back
 */
public record Plausibility(LengthUnit unit) {
  private static final Span RELIEF_MM = new Span(-0.5, 1.5);
  private static final Span ACTION_MM = new Span(0.5, 13);
  private static final Span CLEARANCE_MM = new Span(0, 2);
  private static final Span SCALE_MM = new Span(250, 1000);
  private static final Span GAUGE_IN = new Span(0.006, 0.150);

  /** Plain steel strings end about here (common practice, no source). */
  private static final double PLAIN_IN = 0.030;

  private static final Span CENTS = new Span(-100, 100);
  private static final Span HUMIDITY_PCT = new Span(5, 99);

  /**
   * Looks at everything measured of one string.
   *
   * @param string as it stands on the bench
   * @return a sentence for each figure that is unusual, in the order of the bench sheet
   */
  public List<Message> of(BenchString string) {
    List<Message> unusual = new ArrayList<>();
    scaleMm(string.string().scaleMm()).ifPresent(unusual::add);
    gaugeIn(string.string().make().gaugeIn()).ifPresent(unusual::add);
    plain(string.string().make()).ifPresent(unusual::add);
    look(string.heights().action12Mm(), this::actionMm).ifPresent(unusual::add);
    look(string.heights().nutgap1Mm(), this::clearanceMm).ifPresent(unusual::add);
    look(string.heights().reliefMm(), this::reliefMm).ifPresent(unusual::add);
    sdCents(string.readings().sdCents()).ifPresent(unusual::add);
    return unusual;
  }

  /**
   * Looks at the forward bow of a neck.
   *
   * @param mm by straightedge, millimetres
   * @return a sentence if it is unusual
   */
  public Optional<Message> reliefMm(double mm) {
    return RELIEF_MM.holds(mm) ? Optional.empty() : length("plausible.relief", mm, RELIEF_MM);
  }

  /**
   * Looks at the gap over fret 12, or another fret up there.
   *
   * @param mm millimetres
   * @return a sentence if it is unusual
   */
  public Optional<Message> actionMm(double mm) {
    return ACTION_MM.holds(mm) ? Optional.empty() : length("plausible.action", mm, ACTION_MM);
  }

  /**
   * Looks at the gap over fret 1.
   *
   * @param mm millimetres
   * @return a sentence if it is unusual
   */
  public Optional<Message> clearanceMm(double mm) {
    return CLEARANCE_MM.holds(mm)
        ? Optional.empty()
        : length("plausible.clearance", mm, CLEARANCE_MM);
  }

  /**
   * Looks at a nominal scale.
   *
   * @param mm millimetres
   * @return a sentence if it is unusual
   */
  public Optional<Message> scaleMm(double mm) {
    return SCALE_MM.holds(mm) ? Optional.empty() : length("plausible.scale", mm, SCALE_MM);
  }

  /**
   * Looks for a wound string that was taken for a plain one.
   *
   * @param make of the string
   * @return a sentence if it is of plain steel, and thicker than plain strings are but not than any
   */
  public Optional<Message> plain(StringMake make) {
    double gaugeIn = make.gaugeIn();
    boolean between = gaugeIn > PLAIN_IN && gaugeIn <= GAUGE_IN.to();
    boolean thick = between && make.construction() == Construction.PLAIN_STEEL;
    return thick
        ? Optional.of(
            Message.of("plausible.plain", Figures.gauge(make.gaugeIn()), Figures.gauge(PLAIN_IN)))
        : Optional.empty();
  }

  /**
   * Looks at the outer diameter of a string; a gauge is printed in inches everywhere, so
   * millimetres are said back.
   *
   * @param inches outer diameter
   * @return a sentence if it is unusual
   */
  public Optional<Message> gaugeIn(double inches) {
    if (GAUGE_IN.holds(inches)) {
      return Optional.empty();
    }
    return Optional.of(
        Message.of(
            "plausible.gauge",
            Figures.gauge(inches),
            Figures.fixed(inches * LengthUnit.MM_PER_INCH, 2),
            Figures.gauge(GAUGE_IN.from()),
            Figures.gauge(GAUGE_IN.to())));
  }

  /**
   * Looks at a reading.
   *
   * @param cents positive is sharp
   * @return a sentence if the string is so far off that another note may have been read
   */
  public Optional<Message> cents(double cents) {
    return CENTS.holds(cents)
        ? Optional.empty()
        : Optional.of(Message.of("plausible.cents", Figures.signed(cents, 1)));
  }

  /**
   * Looks at the standard deviation of one reading.
   *
   * @param cents not negative
   * @return a sentence if it is zero, which no tuner reaches
   */
  public Optional<Message> sdCents(double cents) {
    return cents > 0 ? Optional.empty() : Optional.of(Message.of("plausible.sd"));
  }

  /**
   * Looks at the air in the shop.
   *
   * @param percent relative humidity
   * @return a sentence if it is unusual
   */
  public Optional<Message> humidityPct(double percent) {
    return HUMIDITY_PCT.holds(percent)
        ? Optional.empty()
        : Optional.of(Message.of("plausible.humidity", Figures.fixed(percent, 0)));
  }

  private Optional<Message> length(String key, double mm, Span usual) {
    String inMm = Figures.fixed(mm, 2) + " mm";
    String inInches = Figures.fixed(mm / LengthUnit.MM_PER_INCH, 3) + " in";
    boolean metric = unit == LengthUnit.MM;
    return Optional.of(
        Message.of(
            key,
            metric ? inMm : inInches,
            metric ? inInches : inMm,
            bound(usual.from(), metric),
            bound(usual.to(), metric)));
  }

  private static String bound(double mm, boolean metric) {
    return metric
        ? Figures.fixed(mm, 1) + " mm"
        : Figures.fixed(mm / LengthUnit.MM_PER_INCH, 3) + " in";
  }

  private static Optional<Message> look(
      @Nullable Double mm, Function<Double, Optional<Message>> check) {
    return mm == null ? Optional.empty() : check.apply(mm);
  }
}
