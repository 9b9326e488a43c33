package sillet.desktop.visit.aim;

import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import sillet.desktop.controls.TypedFieldModel;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.visits.VisitAim;

/** The aim that is chosen, and the shop's own frets as they are typed. */
public final class AimModel {
  private static final String USUAL_FRETS = "1 5 7 12";

  private final TypedFieldModel<AimChoice> own =
      TypedFieldModel.optional(text -> ownFrets(AimChoice.parse(text)));
  private VisitAim aim;

  public AimModel(VisitAim aim) {
    this.aim = aim;
    own.fill(aim.aim().kind() == AimChoice.Kind.FRETS ? aim.aim().word() : USUAL_FRETS);
  }

  /** A word in the place of frets would choose another aim than the button that is pressed. */
  private static AimChoice ownFrets(AimChoice parsed) {
    return parsed.kind() == AimChoice.Kind.FRETS ? parsed : AimChoice.parse("");
  }

  /** Takes what is chosen elsewhere. */
  public void take(VisitAim now) {
    aim = now;
    if (now.aim().kind() == AimChoice.Kind.FRETS) {
      own.fill(now.aim().word());
    }
  }

  public VisitAim aim() {
    return aim;
  }

  /** Where frets of the shop's own are typed, as in {@code 1 5 7 12:2}. */
  public TypedFieldModel<AimChoice> own() {
    return own;
  }

  /** Chooses an aim; empty if nothing changes or the typed frets cannot be read. */
  public Optional<VisitAim> choose(AimChoice.Kind kind) {
    return switch (kind) {
      case OCTAVE -> change(now -> new VisitAim(AimChoice.OCTAVE, now.nut()));
      case NECK -> change(now -> new VisitAim(AimChoice.NECK, now.nut()));
      case FRETS ->
          own.look() && own.value().isPresent()
              ? change(now -> new VisitAim(own.value().get(), now.nut()))
              : Optional.empty();
    };
  }

  /** Chooses the next aim in turn; frets that cannot be read are passed over. */
  public Optional<VisitAim> nextAim() {
    List<AimChoice.Kind> kinds = List.of(AimChoice.Kind.values());
    int at = kinds.indexOf(aim.aim().kind());
    for (int step = 1; step < kinds.size(); step++) {
      Optional<VisitAim> next = choose(kinds.get((at + step) % kinds.size()));
      if (next.isPresent()) {
        return next;
      }
    }
    return Optional.empty();
  }

  /** Chooses whether the nut can move; empty if nothing changes. */
  public Optional<VisitAim> choose(NutMovable nut) {
    return change(now -> new VisitAim(now.aim(), nut));
  }

  /** Chooses the next in turn. */
  public Optional<VisitAim> nextNut() {
    List<NutMovable> all = List.of(NutMovable.values());
    return choose(all.get((all.indexOf(aim.nut()) + 1) % all.size()));
  }

  private Optional<VisitAim> change(UnaryOperator<VisitAim> how) {
    VisitAim wanted = how.apply(aim);
    if (wanted.equals(aim)) {
      return Optional.empty();
    }
    aim = wanted;
    return Optional.of(wanted);
  }
}
