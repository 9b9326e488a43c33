package sillet.desktop.intake;

import java.util.List;
import sillet.desktop.controls.TypedFieldModel;

/** Judges several fields, so that every wrong one shows at once and not only the first. */
final class Judged {
  private Judged() {}

  static boolean all(List<TypedFieldModel<?>> fields) {
    boolean good = true;
    for (TypedFieldModel<?> field : fields) {
      good = field.look() && good;
    }
    return good;
  }
}
