/**
 * What other strings, another tuning, reference, capo or action would ask for, before anything is
 * bought or cut. Models hold no controls. May use {@code desktop.controls}, {@code
 * desktop.drawing}, {@code desktop.theme} and what lies below the desktop. Lengths in millimetres,
 * gauges in inches, tensions in newtons.
 */
@NullMarked
package sillet.desktop.forecast;

import org.jspecify.annotations.NullMarked;
