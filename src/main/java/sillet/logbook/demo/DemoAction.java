package sillet.logbook.demo;

import java.time.Instant;
import sillet.logbook.actions.Action;

/**
 * One action of the demo shop's story.
 *
 * @param at when it was done, in the story
 * @param technician who did it, in the story
 * @param action what was done
 */
public record DemoAction(Instant at, String technician, Action action) {}
