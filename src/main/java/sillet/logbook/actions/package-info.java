/**
 * Everything a technician can do to the logbook, as values. An action alone is enough to do it
 * again: it carries its own identities and figures.
 */
@NullMarked
package sillet.logbook.actions;

import org.jspecify.annotations.NullMarked;
