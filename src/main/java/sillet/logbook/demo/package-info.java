/**
 * The invented demo shop, told as the actions that make it. Every shop, person, maker, model and
 * figure in it is made up, and its names say "demo" wherever they show.
 */
@NullMarked
package sillet.logbook.demo;

import org.jspecify.annotations.NullMarked;
