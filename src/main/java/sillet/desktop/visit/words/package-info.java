/**
 * What the page says beside each string, and the findings below: advice of the logbook turned into
 * words and figures as a technician reads them. Millimetres without sign, the direction always in
 * words; cents with sign.
 */
@NullMarked
package sillet.desktop.visit.words;

import org.jspecify.annotations.NullMarked;
