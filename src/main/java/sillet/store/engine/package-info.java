/**
 * Opens, creates, brings up to date and closes the database of one logbook, and keeps its one
 * connection on a thread of its own. Says what went wrong as a {@link
 * sillet.store.engine.LogbookProblem}. May use H2, Flyway and Jdbi; knows no table but Flyway's and
 * the numbers of actions.
 */
@NullMarked
package sillet.store.engine;

import org.jspecify.annotations.NullMarked;
