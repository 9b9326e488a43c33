/**
 * What shows while no logbook is open: the first start, and what stands in the way of opening one.
 * Uses controls, drawing and theme, the logbook's shop. Sizes come from the style sheets, in em.
 */
@NullMarked
package sillet.desktop.start;

import org.jspecify.annotations.NullMarked;
