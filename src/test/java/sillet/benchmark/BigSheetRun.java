package sillet.benchmark;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.TimeUnit;

/**
 * Times {@code moves} on a big sheet as a process of its own with the default heap, from start to
 * exit, and watches its memory (where the system tells, as Linux does). Run by hand on the packaged
 * program, with the megabytes as argument, 200 without one.
 */
public final class BigSheetRun {
  private BigSheetRun() {}

  public static void main(String[] args) throws IOException, InterruptedException {
    long megabytes = args.length == 0 ? 200 : Long.parseLong(args[0]);
    Path folder = Files.createTempDirectory("sillet-benchmark");
    Path sheet = folder.resolve("bench.csv");
    Path moves = folder.resolve("moves.csv");
    try {
      long strings = BigSheet.write(sheet, megabytes * 1_000_000);
      say("sheet: %d MB, %d strings", Files.size(sheet) / 1_000_000, strings);
      run(List.of("moves", sheet.toString(), "--out", moves.toString()));
      long rows = rows(moves);
      say("moves: %d MB, %d rows", Files.size(moves) / 1_000_000, rows);
      if (rows != strings + 1) {
        throw new IllegalStateException("a row is missing");
      }
    } finally {
      Files.deleteIfExists(moves);
      Files.deleteIfExists(sheet);
      Files.deleteIfExists(folder);
    }
  }

  private static void run(List<String> arguments) throws IOException, InterruptedException {
    Path java = Path.of(System.getProperty("java.home"), "bin", "java");
    ProcessBuilder builder = new ProcessBuilder(java.toString(), "-jar", "target/sillet.jar");
    builder.command().addAll(arguments);
    long start = System.nanoTime();
    Process process = builder.inheritIO().start();
    long peakKb = 0;
    while (!process.waitFor(200, TimeUnit.MILLISECONDS)) {
      peakKb = Math.max(peakKb, peakKb(process.pid()));
    }
    Duration took = Duration.ofNanos(System.nanoTime() - start);
    say(
        "exit %d after %.1f s, peak %d MB",
        process.exitValue(), took.toMillis() / 1e3, peakKb / 1000);
  }

  /** The most memory a process has held so far, or 0 where the system does not tell. */
  private static long peakKb(long pid) throws IOException {
    Path status = Path.of("/proc", Long.toString(pid), "status");
    if (!Files.exists(status)) {
      return 0;
    }
    return Files.readAllLines(status).stream()
        .filter(line -> line.startsWith("VmHWM:"))
        .mapToLong(line -> Long.parseLong(line.replaceAll("\\D", "")))
        .findFirst()
        .orElse(0);
  }

  private static long rows(Path file) throws IOException {
    try (var lines = Files.lines(file)) {
      return lines.count();
    }
  }

  private static void say(String format, Object... values) {
    System.out.println(String.format(Locale.ROOT, format, values));
  }
}
