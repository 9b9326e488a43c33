/**
 * The search over all instruments: part of a maker, model, serial, tag, customer, telephone number
 * or ticket finds them. Uses controls and theme, the store and the logbook. Sizes come from the
 * style sheets, in em.
 */
@NullMarked
package sillet.desktop.instruments;

import org.jspecify.annotations.NullMarked;
