package sillet;

/** Entry of the program. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    System.err.println("Sillet " + String.join(" ", args));
  }
}
