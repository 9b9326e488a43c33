package sillet.acoustics.virtual;

/** How strings are held at the nut, at a fret under the finger, and at the saddle. */
record Ends(StringEnd nut, StringEnd fret, StringEnd saddle) {}
