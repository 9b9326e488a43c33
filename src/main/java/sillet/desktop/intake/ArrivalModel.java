package sillet.desktop.intake;

import java.time.LocalDate;
import java.util.List;
import sillet.desktop.controls.Readers;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.text.Message;
import sillet.logbook.visits.Arrival;

/** How the instrument comes in: what is asked for, until when, in what air. */
public final class ArrivalModel {
  private final LocalDate today;
  private final TypedFieldModel<String> request =
      TypedFieldModel.required(Readers.words(), Message.of("intake.arrival.request-missing"));
  private final TypedFieldModel<String> condition = TypedFieldModel.optional(Readers.words());
  private final TypedFieldModel<LocalDate> promised;
  private final TypedFieldModel<Double> temperature =
      TypedFieldModel.optional(Readers.number("-30", "60", "°C"));
  private final TypedFieldModel<Double> humidity =
      TypedFieldModel.optional(Readers.number("0", "100", "%"));

  public ArrivalModel(LocalDate today) {
    this.today = today;
    this.promised =
        TypedFieldModel.<LocalDate>optional(text -> DayText.parse(text, today))
            .sayingBack(DayText::said);
  }

  /** The customer's own words. */
  public TypedFieldModel<String> request() {
    return request;
  }

  /** What is seen on arrival. */
  public TypedFieldModel<String> condition() {
    return condition;
  }

  public TypedFieldModel<LocalDate> promised() {
    return promised;
  }

  /** Degrees Celsius. */
  public TypedFieldModel<Double> temperature() {
    return temperature;
  }

  /** Percent. */
  public TypedFieldModel<Double> humidity() {
    return humidity;
  }

  /** Judges the fields. */
  public boolean look() {
    return Judged.all(List.of(request, condition, promised, temperature, humidity));
  }

  /** The arrival; call after the fields were judged. */
  public Arrival arrival(String technician) {
    return new Arrival(
        today,
        technician,
        promised.value().orElse(null),
        request.value().orElse(""),
        condition.value().orElse(""),
        temperature.value().orElse(null),
        humidity.value().orElse(null));
  }
}
