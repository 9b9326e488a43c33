/**
 * The string as an object: material, construction, unit mass, stiffness, strength, and the screw
 * that moves its saddle.
 *
 * <p>SI units, see {@link sillet.acoustics}: diameters in m (not inches), unit mass in kg/m, axial
 * stiffness EA in N, bending stiffness EI in N m2, strength in Pa. Uses {@code solve} only.
 */
@NullMarked
package sillet.acoustics.wire;

import org.jspecify.annotations.NullMarked;
