/** Placeholder head of this package: SI units; cents are positive when sharp. */
@NullMarked
package sillet.acoustics.pitch;

import org.jspecify.annotations.NullMarked;
