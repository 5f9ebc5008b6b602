package org.crossreach.screen;

import org.crossreach.settings.SoundSpeedFormula;

/** The registered formulas for the speed of sound: one line for each choice of the settings. */
final class SoundSpeedLaws {

  private SoundSpeedLaws() {}

  /**
   * The formula that a choice stands for in a given water; any choice but {@link
   * SoundSpeedFormula#AUTO} stands for itself.
   *
   * @param salinityPpt salinity (parts per thousand); water above 0 is saline
   */
  static SoundSpeedFormula chosen(SoundSpeedFormula choice, double salinityPpt) {
    if (choice != SoundSpeedFormula.AUTO) {
      return choice;
    }
    return salinityPpt > 0 ? SoundSpeedFormula.CHEN_MILLERO_1977 : SoundSpeedFormula.MARCZAK_1997;
  }

  /** The law of a formula in a given water. */
  static SoundSpeedLaw of(SoundSpeedFormula choice, double salinityPpt) {
    return switch (chosen(choice, salinityPpt)) {
      case AUTO -> throw new IllegalArgumentException("choice AUTO is no formula of its own");
      case MARCZAK_1997 -> new Marczak1997();
      case CHEN_MILLERO_1977 -> new ChenMillero1977();
      case MEDWIN_1975 -> new Medwin1975();
    };
  }
}
