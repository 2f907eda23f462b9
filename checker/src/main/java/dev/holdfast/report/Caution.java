package dev.holdfast.report;

/** What a recomputed figure is not. */
final class Caution {
  private Caution() {}

  /** The caution for a kind of participant; empty where none may be harmed. */
  static String of(String participants) {
    return switch (participants) {
      case "humans" ->
          text(
              "the responsible statistician, the ethics board and the regulator decide",
              "Too few participants waste what they contribute; too many expose more people than"
                  + " needed.");
      case "animals" ->
          text(
              "the responsible statistician and the animal-welfare board decide",
              "Too few animals waste their use; too many use more than needed.");
      default -> "";
    };
  }

  private static String text(String who, String why) {
    return "A recomputed figure is no ethical or regulatory approval: " + who + ".\n" + why;
  }
}
