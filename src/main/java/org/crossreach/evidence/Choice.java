package org.crossreach.evidence;

import org.crossreach.agreement.Result;
import org.crossreach.agreement.Spread;
import org.crossreach.discharge.ZoneDischarge;
import org.crossreach.settings.Settings;

/**
 * What one combination of laws and exponent makes of a measurement.
 *
 * @param settings the settings with this combination
 * @param result the measurement reduced by them
 * @param changePct mean discharge against that of the chosen settings (%)
 * @param top how the top law predicts hidden cells
 * @param bottom how the bottom law predicts hidden cells
 */
public record Choice(
    Settings settings, Result result, double changePct, Prediction top, Prediction bottom) {

  /** Spread of the passes' discharges (m³/s). */
  public Spread discharge() {
    return result.summary().dischargeM3s();
  }

  /** Share of the unmeasured top in the mean discharge (%). */
  public double topSharePct() {
    return share(result.summary().zones().top());
  }

  /** Share of the unmeasured bottom in the mean discharge (%). */
  public double bottomSharePct() {
    return share(result.summary().zones().bottom());
  }

  private double share(double zone) {
    ZoneDischarge zones = result.summary().zones();
    return 100 * zone / zones.total();
  }

  /**
   * What the hidden cells say the error of the discharge is, were the laws as wrong in the
   * unmeasured zones as in the hidden cells: biases and their standard errors times the zones'
   * shares (%).
   */
  double score() {
    return Math.hypot(top.score() * topSharePct() / 100, bottom.score() * bottomSharePct() / 100);
  }

  /** The combination, for example {@code top constant, bottom power, exponent fit-all}. */
  public String label() {
    return "top "
        + settings.top().key()
        + ", bottom "
        + settings.bottom().key()
        + ", exponent "
        + settings.exponent().rule().key();
  }
}
