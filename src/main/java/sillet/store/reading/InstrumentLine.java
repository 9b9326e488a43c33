package sillet.store.reading;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import sillet.logbook.instruments.Instrument;
import sillet.logbook.shop.Customer;

/**
 * An instrument in a list.
 *
 * @param instrument as it is kept
 * @param customer whose it is now, null if nobody's
 * @param visits how often it was here
 * @param lastTakenIn day of its newest visit, null if it never was here
 * @param openTicket of the visit it is here for now, null if it is not
 */
public record InstrumentLine(
    Kept<Instrument> instrument,
    @Nullable Customer customer,
    int visits,
    @Nullable LocalDate lastTakenIn,
    @Nullable Integer openTicket) {}
