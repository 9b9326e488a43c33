package sillet.desktop.intake;

import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

/** Bridge and saddles as typed. */
public final class SaddleFields {
  private final TypedFieldModel<Double> screw;
  private final TypedFieldModel<Length> thickness;
  private final LengthUnit unit;
  private SaddleKind kind = SaddleKind.SCREW;
  private ScrewSense sense = ScrewSense.NOT_KNOWN;

  SaddleFields(LengthUnit unit) {
    this.unit = unit;
    screw =
        TypedFieldModel.<Double>optional(text -> ScrewText.parse(text, unit))
            .sayingBack(ScrewText::said);
    thickness =
        TypedFieldModel.optional(NeckFields.above(unit)).sayingBack(length -> length.other(unit));
  }

  public SaddleKind kind() {
    return kind;
  }

  public void kind(SaddleKind chosen) {
    kind = chosen;
  }

  /** Way per turn or a thread; blank where it is not known. */
  public TypedFieldModel<Double> screw() {
    return screw;
  }

  public ScrewSense sense() {
    return sense;
  }

  public void sense(ScrewSense chosen) {
    sense = chosen;
  }

  /** Thickness of a one-piece saddle. */
  public TypedFieldModel<Length> thickness() {
    return thickness;
  }

  /** True where there are screws to ask about. */
  public boolean screwed() {
    return kind == SaddleKind.SCREW;
  }

  /** True where there is a thickness to ask about. */
  public boolean onePiece() {
    return kind == SaddleKind.ONE_PIECE;
  }

  boolean look() {
    return screwed() ? screw.look() : !onePiece() || thickness.look();
  }

  void take(Saddle saddle) {
    kind = saddle.kind();
    sense = saddle.screwSense();
    Double screwMm = saddle.screwPitchMm();
    screw.fill(screwMm == null ? "" : InShopUnit.written(screwMm, unit));
    Double thicknessMm = saddle.thicknessMm();
    thickness.fill(thicknessMm == null ? "" : InShopUnit.written(thicknessMm, unit));
  }

  Saddle saddle() {
    return new Saddle(
        kind,
        screwed() ? screw.value().orElse(null) : null,
        screwed() ? sense : ScrewSense.NOT_KNOWN,
        onePiece() ? thickness.value().map(Length::mm).orElse(null) : null);
  }
}
