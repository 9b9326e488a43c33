/** Work lines, notes, advice given and work declined: what is written on a visit, and by whom. */
@NullMarked
package sillet.desktop.visit.log;

import org.jspecify.annotations.NullMarked;
