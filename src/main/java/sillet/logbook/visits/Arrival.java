package sillet.logbook.visits;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * How an instrument came in.
 *
 * @param takenIn day
 * @param takenInBy technician
 * @param promised day, null if none was given
 * @param request in the customer's own words
 * @param condition what was seen on arrival, may be empty
 * @param temperatureC degrees Celsius in the shop, null if not read
 * @param humidityPct relative humidity in percent, null if not read
 */
public record Arrival(
    LocalDate takenIn,
    String takenInBy,
    @Nullable LocalDate promised,
    String request,
    String condition,
    @Nullable Double temperatureC,
    @Nullable Double humidityPct) {}
