/**
 * Answers that may fail, and the search for a root that always comes back.
 *
 * <p>Uses Hipparchus' bracketing solvers and nothing of Sillet. No units: what is searched for has
 * the caller's.
 */
@NullMarked
package sillet.acoustics.solve;

import org.jspecify.annotations.NullMarked;
