package sillet.desktop.controls;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.logbook.text.Message;
import sillet.logbook.units.Length;
import sillet.logbook.units.LengthUnit;

class TypedFieldModelTest {
  private static final Message BLANK = Message.of("number.none", "");

  private final TypedFieldModel<Double> hertz =
      TypedFieldModel.required(Readers.number("400", "480", "Hz"), BLANK);

  @Test
  void isNotBlamedBeforeAnybodyLooked() {
    hertz.typedProperty().set("44");

    assertThat(hertz.stateProperty().get()).isEqualTo(FieldState.NOT_LOOKED_AT);
    assertThat(hertz.problemProperty().get()).isEmpty();
    assertThat(hertz.value()).isEmpty();
  }

  @Test
  void keepsWhatWasTypedAndSaysWhyItCannotBeTaken() {
    hertz.typedProperty().set("44");

    assertThat(hertz.look()).isFalse();
    assertThat(hertz.typedProperty().get()).isEqualTo("44");
    assertThat(hertz.problemProperty().get())
        .contains(Message.of("field.between", "400", "480", "Hz", "44"));
  }

  @Test
  void isClearedAsSoonAsItCanBeTaken() {
    hertz.typedProperty().set("44");
    hertz.look();
    hertz.typedProperty().set("442,5");

    assertThat(hertz.stateProperty().get()).isEqualTo(FieldState.VALID);
    assertThat(hertz.problemProperty().get()).isEmpty();
    assertThat(hertz.value()).contains(442.5);
  }

  @Test
  void isNotBlamedWhileAValidTextIsChanged() {
    hertz.typedProperty().set("442");
    hertz.look();
    hertz.typedProperty().set("4");

    assertThat(hertz.stateProperty().get()).isEqualTo(FieldState.NOT_LOOKED_AT);
  }

  @Test
  void blamesABlankOnlyWhenItIsToBeSaved() {
    hertz.leave();
    assertThat(hertz.problemProperty().get()).isEmpty();

    assertThat(hertz.look()).isFalse();
    assertThat(hertz.problemProperty().get()).contains(BLANK);
  }

  @Test
  void takesABlankWhereItMayStayBlank() {
    TypedFieldModel<Double> field = TypedFieldModel.optional(Readers.number());

    assertThat(field.look()).isTrue();
    assertThat(field.value()).isEmpty();
  }

  @Test
  void saysALengthBackInTheOtherUnit() {
    TypedFieldModel<Length> length =
        TypedFieldModel.optional(Readers.length(LengthUnit.MM))
            .sayingBack(value -> Length.other(value.mm(), LengthUnit.MM));
    length.typedProperty().set("1.6");

    assertThat(length.saidBackProperty().get()).isEqualTo("0.063 in");
  }

  @Test
  void warnsWithoutBlocking() {
    Message unusual = Message.of("number.none", "unusual");
    TypedFieldModel<Double> field =
        TypedFieldModel.optional(Readers.number()).warning(value -> List.of(unusual));
    field.typedProperty().set("9");

    assertThat(field.warningsProperty().get()).containsExactly(unusual);
    assertThat(field.look()).isTrue();
  }

  @Test
  void forgetsTheBlameWhenItIsFilledAnew() {
    hertz.typedProperty().set("x");
    hertz.look();
    hertz.fill("440");

    assertThat(hertz.stateProperty().get()).isEqualTo(FieldState.NOT_LOOKED_AT);
    assertThat(hertz.value()).contains(440.0);
  }
}
