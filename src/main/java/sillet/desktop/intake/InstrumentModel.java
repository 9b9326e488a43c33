package sillet.desktop.intake;

import java.util.List;
import java.util.Optional;
import java.util.UUID;
import java.util.function.Function;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.text.Message;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/** The instrument: one the logbook knows, or a new one. */
public final class InstrumentModel {
  private final Supplier<UUID> ids;
  private final TypedFieldModel<String> maker = TypedFieldModel.optional(Readers.words());
  private final TypedFieldModel<String> model =
      TypedFieldModel.required(Readers.words(), Message.of("intake.instrument.model-missing"));
  private final TypedFieldModel<String> serial = TypedFieldModel.optional(Readers.words());
  private final TypedFieldModel<String> tag = TypedFieldModel.optional(Readers.words());
  private final NeckFields neck;
  private final SaddleFields saddle;
  private InstrumentKind kind = InstrumentKind.ELECTRIC;
  private UUID newId;
  private @Nullable Instrument known;

  /**
   * No instrument yet.
   *
   * @param ids a new identity each time, should it be a new one
   * @param unit the shop's
   * @param unusualScale warnings for a scale that is out of the ordinary
   */
  public InstrumentModel(
      Supplier<UUID> ids, LengthUnit unit, Function<Length, List<Message>> unusualScale) {
    this.ids = ids;
    this.newId = ids.get();
    this.neck = new NeckFields(unit, unusualScale);
    this.saddle = new SaddleFields(unit);
  }

  public InstrumentKind kind() {
    return kind;
  }

  /** Chooses the kind and fills in what such an instrument usually has, to be typed over. */
  public void kind(UsualKind usual) {
    kind = usual.kind();
    neck.strings().fill(Integer.toString(usual.strings()));
    neck.frets().fill(Integer.toString(usual.frets()));
    saddle.kind(usual.saddle());
  }

  public TypedFieldModel<String> maker() {
    return maker;
  }

  public TypedFieldModel<String> model() {
    return model;
  }

  public TypedFieldModel<String> serial() {
    return serial;
  }

  /** The shop's own mark on it. */
  public TypedFieldModel<String> tag() {
    return tag;
  }

  public NeckFields neck() {
    return neck;
  }

  public SaddleFields saddle() {
    return saddle;
  }

  /** The instrument chosen from those the logbook knows. */
  public Optional<Instrument> known() {
    return Optional.ofNullable(known);
  }

  /** Takes an instrument the logbook knows; its fields are only to look at then. */
  public void choose(Instrument instrument) {
    known = instrument;
    kind = instrument.kind();
    maker.fill(instrument.maker());
    model.fill(instrument.model());
    serial.fill(instrument.serial());
    tag.fill(instrument.tag());
    neck.take(instrument.neck());
    saddle.take(instrument.saddle());
  }

  /** It is a new one after all. */
  public void anotherOne() {
    known = null;
    // the known one may have been made on this page a moment ago, under the identity given then
    newId = ids.get();
    List.of(maker, model, serial, tag).forEach(field -> field.fill(""));
    neck.scaleTreble().fill("");
    neck.scaleBass().fill("");
    neck.radius().fill("");
    saddle.screw().fill("");
    saddle.thickness().fill("");
  }

  /** Judges the fields. */
  public boolean look() {
    if (known != null) {
      return true;
    }
    boolean words = Judged.all(List.of(maker, model, serial, tag));
    boolean measured = neck.look();
    return saddle.look() && measured && words;
  }

  /** The instrument as chosen or typed; call after the fields were judged. */
  public Instrument instrument(UUID customerId) {
    if (known != null) {
      return known;
    }
    return new Instrument(
        newId,
        customerId,
        kind,
        maker.value().orElse(""),
        model.value().orElse(""),
        serial.value().orElse(""),
        tag.value().orElse(""),
        neck.neck(),
        saddle.saddle());
  }
}
