package sillet.desktop.controls;

import sillet.logbook.text.Texts;
import sillet.store.Logbook;

/**
 * What every screen is handed.
 *
 * @param logbook what is open; to be touched in the background only
 * @param background where work on the logbook is done
 * @param goTo the other places
 * @param ask questions to the technician
 * @param sign what is saved
 * @param texts the words
 * @param atBench shop, technician and clock
 */
public record Desk(
    Logbook logbook,
    Background background,
    GoTo goTo,
    Ask ask,
    SaveSign sign,
    Texts texts,
    AtBench atBench) {}
