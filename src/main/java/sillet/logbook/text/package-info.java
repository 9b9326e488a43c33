/**
 * Words for people: one bundle of text keys, and messages that are a key plus values until the edge
 * turns them into a sentence. May use the Java library only.
 */
@NullMarked
package sillet.logbook.text;

import org.jspecify.annotations.NullMarked;
