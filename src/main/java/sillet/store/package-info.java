/**
 * The logbook on the disk: {@link sillet.store.Logbook} opens one and hands out the place that
 * saves and the questions. May use {@code logbook} and {@code acoustics}; H2, Flyway, Jdbi and Gson
 * stay inside its packages.
 */
@NullMarked
package sillet.store;

import org.jspecify.annotations.NullMarked;
