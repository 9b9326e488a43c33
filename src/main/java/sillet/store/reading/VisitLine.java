package sillet.store.reading;

import java.time.LocalDate;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.shop.Customer;

/**
 * A visit in a list.
 *
 * @param visitId identity
 * @param ticket number
 * @param takenIn day
 * @param promised day, null if none was given
 * @param request in the customer's own words
 * @param instrument what came in
 * @param customer whose it was then, null if nobody's
 */
public record VisitLine(
    UUID visitId,
    int ticket,
    LocalDate takenIn,
    @Nullable LocalDate promised,
    String request,
    Instrument instrument,
    @Nullable Customer customer) {}
