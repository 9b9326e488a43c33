/**
 * What is unusual though possible: such a figure is taken, and said back in the other unit so that
 * a slip shows at once. Never a refusal. Lengths in millimetres, gauges in inches; may use the
 * other packages of {@code logbook}.
 */
@NullMarked
package sillet.logbook.plausible;

import org.jspecify.annotations.NullMarked;
