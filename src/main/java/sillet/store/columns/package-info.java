/**
 * How the values of the logbook stand in columns and in recorded actions: kinds by their stable
 * word, times in UTC to the microsecond, what people look for folded into search keys. May use Jdbi
 * and the records of the logbook.
 */
@NullMarked
package sillet.store.columns;

import org.jspecify.annotations.NullMarked;
