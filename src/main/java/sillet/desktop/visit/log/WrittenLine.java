package sillet.desktop.visit.log;

/**
 * A line that was written.
 *
 * @param time of the day
 * @param kind what it is for; empty for work
 * @param text the words
 */
public record WrittenLine(String time, String kind, String text) {}
