package sillet.desktop.controls;

/** What is known of a field. A field nobody has left yet is never called wrong. */
public enum FieldState {
  NOT_LOOKED_AT,
  VALID,
  INVALID
}
