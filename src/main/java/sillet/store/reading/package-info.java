/**
 * Questions to the logbook, answered with its own records. Nothing here changes a row. May use the
 * engine and Jdbi.
 */
@NullMarked
package sillet.store.reading;

import org.jspecify.annotations.NullMarked;
