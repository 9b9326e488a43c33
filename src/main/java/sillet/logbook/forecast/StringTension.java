package sillet.logbook.forecast;

import org.jspecify.annotations.Nullable;

/**
 * How hard a string pulls now and then.
 *
 * @param nowN tension now, newtons
 * @param thenN tension then, newtons
 * @param thenSdN standard deviation of the tension then, newtons
 * @param feel the string then against the same string now
 * @param inSet the string then against the mean of the set then: a set of equal tension has the
 *     same feel on every string
 * @param breakingShareThen share of the breaking tension then, 1 = it breaks; null where no
 *     strength is known
 */
public record StringTension(
    double nowN,
    double thenN,
    double thenSdN,
    StringFeel feel,
    StringFeel inSet,
    @Nullable Double breakingShareThen) {}
