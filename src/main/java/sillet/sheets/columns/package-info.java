/** The names of columns that more than one sheet uses. Uses nothing. */
@NullMarked
package sillet.sheets.columns;

import org.jspecify.annotations.NullMarked;
