package sillet.desktop.intake;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import sillet.acoustics.pitch.EqualTemperament;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.Neck;
import sillet.logbook.strings.StringMake;
import sillet.logbook.strings.StringSet;
import sillet.logbook.strings.Tuning;
import sillet.logbook.text.Message;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.StringsOn;

/**
 * What is on the instrument: a set from the drawer or one typed string by string, and the tuning.
 */
public final class StringsModel {
  private static final int SHORT_STRING = 5;
  private static final int SHORT_STRING_FRET = 5;
  private static final int BANJO_STRINGS = 5;

  private final LengthUnit unit;
  private final double referenceHz;
  private final UUID newSetId;
  private final Function<Double, List<Message>> unusualGauge;
  private final TypedFieldModel<String> setName = TypedFieldModel.optional(Readers.words());
  private final TypedFieldModel<String> tuningName = TypedFieldModel.optional(Readers.words());
  private final TypedFieldModel<LocalDate> fittedOn;
  private final List<StringLine> lines = new ArrayList<>();
  private @Nullable StringSet chosen;
  private boolean keep;

  /**
   * Nothing on yet.
   *
   * @param newSetId identity of the set, should it be kept as a new one
   * @param unit the shop's
   * @param referenceHz what A4 is
   * @param today what days are counted from
   * @param unusualGauge warnings for a gauge that is out of the ordinary, inches
   */
  public StringsModel(
      UUID newSetId,
      LengthUnit unit,
      double referenceHz,
      LocalDate today,
      Function<Double, List<Message>> unusualGauge) {
    this.newSetId = newSetId;
    this.unit = unit;
    this.referenceHz = referenceHz;
    this.unusualGauge = unusualGauge;
    this.fittedOn =
        TypedFieldModel.<LocalDate>optional(text -> DayText.parse(text, today))
            .sayingBack(DayText::said);
  }

  /** The strings, string 1 first. */
  public List<StringLine> lines() {
    return List.copyOf(lines);
  }

  public TypedFieldModel<String> setName() {
    return setName;
  }

  public TypedFieldModel<String> tuningName() {
    return tuningName;
  }

  /** Day the set went on; blank if not known. */
  public TypedFieldModel<LocalDate> fittedOn() {
    return fittedOn;
  }

  /** Makes so many lines; what was typed in those that stay is kept. */
  public void count(int strings) {
    while (lines.size() > strings) {
      lines.remove(lines.size() - 1);
    }
    while (lines.size() < strings) {
      lines.add(new StringLine(lines.size() + 1, unit, referenceHz, unusualGauge));
    }
  }

  /** Fills the scale of every string from the neck; each may be typed over. */
  public void scales(Neck neck, InstrumentKind kind) {
    for (StringLine line : lines) {
      double mm = neck.scaleMm(line.number());
      boolean ownNut =
          kind == InstrumentKind.BANJO
              && neck.strings() == BANJO_STRINGS
              && line.number() == SHORT_STRING;
      double own = ownNut ? mm / EqualTemperament.frequency(SHORT_STRING_FRET, 1) : mm;
      line.scale().fill(InShopUnit.written(own, unit));
    }
  }

  /** Takes the strings of a set as far as there are lines. */
  public void take(StringSet set) {
    chosen = set;
    setName.fill(set.name());
    for (int i = 0; i < Math.min(lines.size(), set.strings().size()); i++) {
      lines.get(i).take(set.strings().get(i));
    }
  }

  /** Takes what was on the instrument when it was here last, as far as there are lines. */
  public void take(StringsOn last) {
    setName.fill(last.setName());
    tuningName.fill(last.tuningName());
    fittedOn.fill(last.fittedOn() == null ? "" : last.fittedOn().toString());
    for (int i = 0; i < Math.min(lines.size(), last.strings().size()); i++) {
      lines.get(i).take(last.strings().get(i));
    }
  }

  /** The set was kept: it is not kept a second time. */
  void kept(StringSet set) {
    chosen = set;
  }

  /** Takes the pitches of a tuning as far as there are lines. */
  public void take(Tuning tuning) {
    tuningName.fill(tuning.name());
    for (int i = 0; i < Math.min(lines.size(), tuning.pitches().size()); i++) {
      lines.get(i).pitch().fill(tuning.pitches().get(i));
    }
  }

  /** Takes for each gauge the construction that is usual on such an instrument. */
  public void usual(UsualKind usual) {
    lines.forEach(line -> line.usual(usual));
  }

  /** Whether the strings as typed go into the drawer as a set. */
  public void keepAsSet(boolean wanted) {
    keep = wanted;
  }

  public boolean keepAsSet() {
    return keep;
  }

  /** Judges the fields; a set that is kept needs a name. */
  public boolean look() {
    boolean all = Judged.all(List.of(setName, tuningName, fittedOn));
    for (StringLine line : lines) {
      all = line.look() && all;
    }
    return all && !lines.isEmpty() && (!keep || setName.value().isPresent());
  }

  private List<StringMake> makes() {
    return lines.stream().map(StringLine::make).toList();
  }

  /** The action that keeps the set; empty if it is not wanted or is in the drawer as it is. */
  public Optional<KeepStringSet> keeping() {
    if (!keep) {
      return Optional.empty();
    }
    String name = setName.value().orElseThrow();
    if (chosen != null && chosen.name().equals(name)) {
      return chosen.strings().equals(makes())
          ? Optional.empty()
          : Optional.of(new KeepStringSet(new StringSet(chosen.id(), name, makes())));
    }
    return Optional.of(new KeepStringSet(new StringSet(newSetId, name, makes())));
  }

  /** The strings as they are on the instrument; call after the fields were judged. */
  public StringsOn strings() {
    return new StringsOn(
        setName.value().orElse(""),
        fittedOn.value().orElse(null),
        tuningName.value().orElse(""),
        referenceHz,
        lines.stream().map(StringLine::fitted).toList());
  }
}
