/**
 * The shop itself, its technicians and its customers: who works here and whose instruments they
 * are.
 */
@NullMarked
package sillet.logbook.shop;

import org.jspecify.annotations.NullMarked;
