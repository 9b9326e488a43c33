/**
 * The stiff string: how bending stiffness and the ends raise its modes, and the tension that brings
 * it to pitch.
 *
 * <p>SI units, see {@link sillet.acoustics}. Uses {@code solve}, {@code pitch} and {@code wire}.
 *
 * <p>Two quantities that the literature both calls B are kept apart here. {@code inharmonicity} is
 * Fletcher's, pi^2 EI / (T L^2), about 1e-5 to 5e-4. {@code beta} is delta / L with the bending
 * length delta = sqrt(EI / T), about 1e-3 to 5e-3; inharmonicity = (pi beta)^2.
 */
@NullMarked
package sillet.acoustics.stiff;

import org.jspecify.annotations.NullMarked;
