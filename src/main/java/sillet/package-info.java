/**
 * The entry: turns arguments into a command, or opens the window when there are none. It may use
 * every layer; no layer may use it.
 */
@NullMarked
package sillet;

import org.jspecify.annotations.NullMarked;
