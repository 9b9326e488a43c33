package sillet.command;

import java.io.IOException;
import java.io.Writer;

/** Something a command has to hand out. */
@FunctionalInterface
interface DataWriter {
  void writeTo(Writer out) throws IOException;
}
