package org.crossreach.profile;

import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.TopLaw;

/** The registered laws: one line for each choice of the settings. */
public final class Laws {

  private Laws() {}

  /** The law for the unmeasured water near the surface. */
  public static UnmeasuredLaw of(TopLaw law) {
    return switch (law) {
      case POWER -> new PowerTop();
      case CONSTANT -> new ConstantTop();
      case THREE_POINT -> new ThreePointTop();
    };
  }

  /** The law for the unmeasured water near the bed. */
  public static UnmeasuredLaw of(BottomLaw law) {
    return switch (law) {
      case POWER -> new PowerBottom();
      case NO_SLIP -> new NoSlipBottom();
    };
  }
}
