/**
 * What the moves of a visit serve: the aim and whether the nut can move. May use {@code
 * desktop.controls}, {@code desktop.theme} and the logbook.
 */
@NullMarked
package sillet.desktop.visit.aim;

import org.jspecify.annotations.NullMarked;
