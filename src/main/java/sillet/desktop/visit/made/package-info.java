/**
 * What was really done to the saddles after a pass: the proposals as a start, each to be confirmed
 * or changed, in turns or millimetres. A saddle move is positive away from the neck.
 */
@NullMarked
package sillet.desktop.visit.made;

import org.jspecify.annotations.NullMarked;
