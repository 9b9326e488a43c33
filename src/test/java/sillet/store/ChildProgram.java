package sillet.store;

import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Starts a second program with the classes of the tests. */
public final class ChildProgram {
  private ChildProgram() {}

  /** Starts the main method of a class; what it says comes through its standard output. */
  public static Process start(Class<?> main, String... arguments) throws IOException {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(List.of("-XX:TieredStopAtLevel=1", "-XX:+UseSerialGC", "-Xmx128m"));
    command.add("-cp");
    command.add(
        System.getProperty("surefire.test.class.path", System.getProperty("java.class.path")));
    command.add(main.getName());
    command.addAll(List.of(arguments));
    return new ProcessBuilder(command).redirectError(new File(arguments[0] + ".errors")).start();
  }
}
