package sillet.desktop.visit;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.UUID;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Ask;
import sillet.desktop.controls.AtBench;
import sillet.desktop.controls.Background;
import sillet.desktop.controls.Desk;
import sillet.desktop.controls.GoTo;
import sillet.desktop.controls.SaveSign;
import sillet.logbook.shop.Shop;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.store.Logbook;

/** A desk whose every answer a test can set and read. */
public final class TestDesk implements Ask, AtBench, GoTo, SaveSign {
  public static final Instant NOW = Instant.parse("2026-12-01T10:30:00Z");

  private final Logbook logbook;
  private final Background background;
  public final List<String> went = new ArrayList<>();
  public final List<String> signs = new ArrayList<>();
  public @Nullable Path file;
  public boolean sure = true;

  public TestDesk(Logbook logbook, Background background) {
    this.logbook = logbook;
    this.background = background;
  }

  public Desk desk() {
    return new Desk(logbook, background, this, this, this, Texts.english(), this);
  }

  @Override
  public Shop shop() {
    return Shop.usual("Invented shop", List.of("Noor", "Edda"));
  }

  @Override
  public String technician() {
    return "Noor";
  }

  @Override
  public Clock clock() {
    return Clock.fixed(NOW, ZoneOffset.UTC);
  }

  @Override
  public Optional<Path> fileToSave(String suggestedName) {
    went.add("file " + suggestedName);
    return Optional.ofNullable(file);
  }

  @Override
  public Optional<Path> fileToOpen() {
    return Optional.empty();
  }

  @Override
  public boolean confirm(Message question) {
    went.add("asked " + question.key());
    return sure;
  }

  @Override
  public void problem(Message what) {
    went.add("problem " + what.key());
  }

  @Override
  public void bench() {
    went.add("bench");
  }

  @Override
  public void instruments() {
    went.add("instruments");
  }

  @Override
  public void takeIn(@Nullable UUID instrumentId) {
    went.add("take in");
  }

  @Override
  public void visit(int ticket) {
    went.add("visit " + ticket);
  }

  @Override
  public void forecast(int ticket) {
    went.add("forecast " + ticket);
  }

  @Override
  public void history(UUID instrumentId) {
    went.add("history");
  }

  @Override
  public void frets(UUID instrumentId) {
    went.add("frets");
  }

  @Override
  public void pickups(UUID instrumentId) {
    went.add("pickups");
  }

  @Override
  public void start() {
    went.add("start");
  }

  @Override
  public void back() {
    went.add("back");
  }

  @Override
  public void saved(Instant at) {
    signs.add("saved");
  }

  @Override
  public void draft(Instant since) {
    signs.add("draft");
  }

  @Override
  public void notSaved(Message why) {
    signs.add("not saved " + why.key());
  }

  /** What the sign says now. */
  public String sign() {
    return signs.isEmpty() ? "" : signs.get(signs.size() - 1);
  }
}
