package sillet.desktop.intake;

import java.util.List;
import java.util.function.Function;
import sillet.acoustics.wire.Construction;
import sillet.desktop.controls.GaugeText;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;

/** One string as typed: pitch, gauge, construction, scale. */
public final class StringLine {
  private final int number;
  private final LengthUnit unit;
  private final TypedFieldModel<Pitch> pitch;
  private final TypedFieldModel<Double> gauge;
  private final TypedFieldModel<Length> scale;
  private Construction construction = Construction.PLAIN_STEEL;
  private boolean constructionChosen;
  private StringMake madeBefore;

  StringLine(
      int number,
      LengthUnit unit,
      double referenceHz,
      Function<Double, List<Message>> unusualGauge) {
    this.number = number;
    this.unit = unit;
    this.madeBefore = StringMake.of(1, Construction.PLAIN_STEEL);
    pitch =
        TypedFieldModel.required(
                text -> Pitch.parse(text, referenceHz), Message.of("intake.strings.pitch-missing"))
            .sayingBack(found -> Figures.fixed(found.hz(), 2) + " Hz");
    gauge =
        TypedFieldModel.required(GaugeText::parse, Message.of("intake.strings.gauge-missing"))
            .sayingBack(GaugeText::said)
            .warning(unusualGauge);
    scale =
        TypedFieldModel.required(
                NeckFields.above(unit), Message.of("intake.instrument.scale-missing"))
            .sayingBack(length -> length.other(unit));
  }

  /** 1 on the treble side. */
  public int number() {
    return number;
  }

  public TypedFieldModel<Pitch> pitch() {
    return pitch;
  }

  /** Inches. */
  public TypedFieldModel<Double> gauge() {
    return gauge;
  }

  /** From its own nut where it has one. */
  public TypedFieldModel<Length> scale() {
    return scale;
  }

  public Construction construction() {
    return construction;
  }

  /** Chooses how it is made; the usual one of its gauge no longer counts. */
  public void construction(Construction chosen) {
    construction = chosen;
    constructionChosen = true;
  }

  /** Takes the construction that is usual for its gauge, until another is chosen. */
  void usual(UsualKind usual) {
    if (!constructionChosen) {
      gauge.value().ifPresent(gaugeIn -> construction = usual.construction(gaugeIn));
    }
  }

  /** Takes a string out of a set. */
  void take(StringMake make) {
    gauge.fill(Figures.gauge(make.gaugeIn()));
    construction(make.construction());
    madeBefore = make;
  }

  /** Takes a string as it was on the instrument. */
  void take(FittedString string) {
    pitch.fill(string.pitch().typed());
    scale.fill(InShopUnit.written(string.scaleMm(), unit));
    take(string.make());
  }

  boolean look() {
    return Judged.all(List.of(pitch, gauge, scale));
  }

  /** What was typed of the string itself; what a set knows beyond that stays with its gauge. */
  StringMake make() {
    double gaugeIn = gauge.value().orElseThrow();
    boolean same =
        Figures.gauge(gaugeIn).equals(Figures.gauge(madeBefore.gaugeIn()))
            && construction == madeBefore.construction();
    return same ? madeBefore : StringMake.of(gaugeIn, construction);
  }

  FittedString fitted() {
    return new FittedString(
        number, pitch.value().orElseThrow(), scale.value().orElseThrow().mm(), make());
  }
}
