package sillet.desktop.sets;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import sillet.acoustics.wire.Construction;
import sillet.desktop.controls.GaugeText;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.DecimalText;
import sillet.logbook.units.Figures;

/** One string of a set as it is typed. */
final class SetLineModel {
  private static final double WOUND_FROM_IN = 0.0215;

  private final TypedFieldModel<Double> gauge;
  private final TypedFieldModel<Double> core;
  private final TypedFieldModel<Double> mass;
  private Construction construction = Construction.PLAIN_STEEL;
  private boolean constructionChosen;

  SetLineModel() {
    gauge =
        TypedFieldModel.required(GaugeText::parse, Message.of("sets.gauge-missing"))
            .sayingBack(GaugeText::said);
    core = TypedFieldModel.optional(this::readCore);
    mass = TypedFieldModel.optional(SetLineModel::readMass);
  }

  static SetLineModel of(StringMake make) {
    SetLineModel line = new SetLineModel();
    line.gauge.fill(Figures.gauge(make.gaugeIn()));
    line.construction(make.construction());
    Double core = make.coreIn();
    Double unitMass = make.unitMassGPerM();
    line.core.fill(core == null ? "" : Figures.gauge(core));
    line.mass.fill(unitMass == null ? "" : Double.toString(unitMass));
    return line;
  }

  /** Outer diameter, inches. */
  TypedFieldModel<Double> gauge() {
    return gauge;
  }

  /** Core, inches; blank where it is not known. */
  TypedFieldModel<Double> core() {
    return core;
  }

  /** Unit mass, grams per metre; blank where it is not known. */
  TypedFieldModel<Double> mass() {
    return mass;
  }

  Construction construction() {
    return construction;
  }

  void construction(Construction chosen) {
    construction = chosen;
    constructionChosen = true;
  }

  /** A thick string is wound, until somebody says what it is. */
  void guessConstruction() {
    if (!constructionChosen && gauge.value().isPresent()) {
      boolean thick = gauge.value().orElseThrow() >= WOUND_FROM_IN;
      construction = thick ? Construction.WOUND_STEEL : Construction.PLAIN_STEEL;
    }
  }

  boolean look() {
    // the core is read against the gauge, which may have been typed after it
    String typed = core.typedProperty().get();
    core.fill("");
    core.fill(typed);
    boolean all = gauge.look();
    all = core.look() && all;
    return mass.look() && all;
  }

  /** What is wrong with the line, the first thing only. */
  Optional<Message> problem() {
    return Stream.of(gauge, core, mass)
        .flatMap(field -> field.problemProperty().get().stream())
        .findFirst();
  }

  List<TypedFieldModel<Double>> fields() {
    return List.of(gauge, core, mass);
  }

  /** Call after {@link #look} was true. */
  StringMake make() {
    return new StringMake(
        gauge.value().orElseThrow(),
        construction,
        ConstructionWords.wound(construction) ? core.value().orElse(null) : null,
        mass.value().orElse(null));
  }

  private double readCore(String text) {
    double coreIn = GaugeText.parse(text);
    double gaugeIn = gauge.value().orElse(Double.POSITIVE_INFINITY);
    if (!ConstructionWords.wound(construction)) {
      throw Rejection.of("sets.core-of-plain");
    }
    if (coreIn >= gaugeIn) {
      throw Rejection.of("string.core-too-thick", Figures.gauge(coreIn), Figures.gauge(gaugeIn));
    }
    return coreIn;
  }

  private static double readMass(String text) {
    double gramsPerMetre = DecimalText.parse(text).value();
    if (!(gramsPerMetre > 0) || gramsPerMetre > 100) {
      throw Rejection.of("field.between", "0.01", "100", "g/m", text.strip());
    }
    return gramsPerMetre;
  }
}
