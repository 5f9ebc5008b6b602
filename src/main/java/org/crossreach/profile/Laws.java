package org.crossreach.profile;

import org.crossreach.section.Column;
import org.crossreach.section.Component;
import org.crossreach.settings.BottomLaw;
import org.crossreach.settings.TopLaw;

/** The registered laws: one line for each choice of the settings. */
public final class Laws {

  private Laws() {}

  /** The law for the unmeasured water near the surface. */
  public static VelocityLaw of(TopLaw law) {
    return switch (law) {
      case POWER -> new PowerLaw();
      case CONSTANT -> new ConstantLaw();
      case THREE_POINT -> new ThreePointLaw();
    };
  }

  /** The law for the unmeasured water near the bed. */
  public static VelocityLaw of(BottomLaw law) {
    return switch (law) {
      case POWER -> new PowerLaw();
      case NO_SLIP -> new NoSlipLaw();
    };
  }

  /** Transport between the highest usable cell and the surface, per unit width (m²/s). */
  static double top(VelocityLaw law, Column column, Component component, double exponent) {
    return law.transport(column, component, exponent, column.upperM(0), column.depthM());
  }

  /** Transport between the bed and the lowest usable cell, per unit width (m²/s). */
  static double bottom(VelocityLaw law, Column column, Component component, double exponent) {
    return law.transport(column, component, exponent, 0, column.lowerM(column.size() - 1));
  }
}
