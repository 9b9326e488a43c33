/**
 * The one place that takes an action: each in one transaction with its own row in the table of
 * actions, on the disk before it counts as saved; and the way back from such rows to the same
 * logbook. May use the engine, Jdbi and Gson.
 */
@NullMarked
package sillet.store.saving;

import org.jspecify.annotations.NullMarked;
