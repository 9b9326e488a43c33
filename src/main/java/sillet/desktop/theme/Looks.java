package sillet.desktop.theme;

import javafx.css.PseudoClass;

/** Names of the style classes and states in {@code sillet.css}. Screens use these and no others. */
public final class Looks {
  // grounds
  /** The window's ground. */
  public static final String BENCH_GROUND = "bench-ground";

  /** A sheet on the bench: told apart by its ground, no box, no radius. */
  public static final String PANEL = "panel";

  /** The window's outer margin and the gap between panels, for a VBox or HBox. */
  public static final String PAGE = "page";

  public static final String RULE_ABOVE = "rule-above";
  public static final String RULE_BELOW = "rule-below";

  // type
  /** Page or instrument name. */
  public static final String PAGE_NAME = "page-name";

  public static final String PANEL_HEAD = "panel-head";

  /** The figure to act on, the newer of two figures, the current place. */
  public static final String STRONG = "strong";

  /** A sentence in a tight place. */
  public static final String TIGHT = "tight";

  /** Notes, units, scales: the smallest size. */
  public static final String NOTE = "note";

  public static final String SOFT = "soft";

  /** Bold in pencil: a state that still needs a hand. */
  public static final String NEEDS_HAND = "needs-hand";

  /** A count in pencil behind a section word. */
  public static final String NEEDS_HAND_NOTE = "needs-hand-note";

  /** The customer's words. */
  public static final String CUSTOMER_WORDS = "customer-words";

  public static final String CAUTION = "caution";

  /** A figure, aligned by its right edge. */
  public static final String FIGURE = "figure";

  /** A unit as a run of its own behind a figure. */
  public static final String UNIT = "unit";

  /** A wrapping sentence with the line height of sentences. */
  public static final String SENTENCE = "sentence";

  // buttons and words to go by
  /** The one thing to do next; other buttons need no class. */
  public static final String PRIMARY = "primary";

  /** A toggle button of which the chosen one stands on ink. */
  public static final String CHOICE = "choice";

  /** The key beside a button's name, as its graphic on the right. */
  public static final String KEY_HINT = "key-hint";

  /** A place in the top line. */
  public static final String PLACE_WORD = "place-word";

  /** A section of a visit, with a mark and a count. */
  public static final String SECTION_WORD = "section-word";

  // fields
  public static final String ERROR_HEAD = "error-head";
  public static final String ERROR_DETAIL = "error-detail";

  /**
   * A text field of the entry grid. Its states: {@link #UNREAD}, {@link #STALE}, {@link #ERROR}.
   */
  public static final String READING_CELL = "reading-cell";

  // rows
  /** A row of a table that is not a TableView. */
  public static final String TABLE_ROW = "table-row";

  /** A row of a list that is not a ListView. */
  public static final String LIST_ROW = "list-row";

  /** A row that holds the focus: lamp ground and ring. */
  public static final String LIT_ROW = "lit-row";

  // visit
  public static final String TICKET_STUB = "ticket-stub";
  public static final String TICKET_NUMBER = "ticket-number";
  public static final String MOVE_FIGURE = "move-figure";
  public static final String MOVE_DIRECTION = "move-direction";

  /** "turns" and "at" beside a figure. */
  public static final String MOVE_UNIT = "move-unit";

  public static final String MOVE_SMALL = "move-small";
  public static final String NOW_FIGURE = "now-figure";
  public static final String NOW_DIRECTION = "now-direction";

  /** A canvas that takes colours and em from the sheets. */
  public static final String DRAWN = "drawn";

  /** A mark in a line of words. */
  public static final String SMALL_MARK = "small-mark";

  // states
  /** The place or section one is at. */
  public static final PseudoClass CURRENT = PseudoClass.getPseudoClass("current");

  /** A cell nobody has typed in: broken border. */
  public static final PseudoClass UNREAD = PseudoClass.getPseudoClass("unread");

  /** A figure that must be read again: struck through. */
  public static final PseudoClass STALE = PseudoClass.getPseudoClass("stale");

  /** What was typed cannot be taken: pencil border. */
  public static final PseudoClass ERROR = PseudoClass.getPseudoClass("error");

  /** A place that stays as it is: its figure is not one to act on. */
  public static final PseudoClass STANDING = PseudoClass.getPseudoClass("standing");

  private Looks() {}
}
