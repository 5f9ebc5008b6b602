package org.crossreach.screen;

import org.crossreach.settings.SoundSpeed;
import org.crossreach.survey.EnsembleQuantity;
import org.crossreach.survey.Ensembles;
import org.crossreach.survey.Gaps;
import org.crossreach.survey.Water;

/**
 * Temperature of the water at the transducer (deg C) and where it comes from: as given in the
 * settings; else as recorded, linear in time over gaps; else the independent check; else unknown.
 *
 * @param source where it comes from
 * @param degC one for each ensemble, or a single one for all; a single NaN when unknown
 * @param sensorMeanDegC mean of what was recorded (deg C), NaN when nothing was
 */
record WaterTemperature(Source source, double[] degC, double sensorMeanDegC) {

  /** Where a temperature comes from. */
  enum Source {
    GIVEN("given"),
    SENSOR("sensor"),
    CHECK("check"),
    UNKNOWN("unknown");

    private final String key;

    Source(String key) {
      this.key = key;
    }

    String key() {
      return key;
    }
  }

  static WaterTemperature of(
      Ensembles ensembles, double[] elapsedS, Water water, SoundSpeed choice) {
    double[] sensor = new double[ensembles.size()];
    double sum = 0;
    int count = 0;
    for (int i = 0; i < sensor.length; i++) {
      sensor[i] = ensembles.value(EnsembleQuantity.TEMPERATURE_DEGC, i);
      if (!Double.isNaN(sensor[i])) {
        sum += sensor[i];
        count++;
      }
    }
    double mean = count == 0 ? Double.NaN : sum / count;
    if (!Double.isNaN(choice.temperatureDegC())) {
      return new WaterTemperature(Source.GIVEN, new double[] {choice.temperatureDegC()}, mean);
    }
    if (count > 0) {
      return new WaterTemperature(Source.SENSOR, Gaps.fillLinear(sensor, elapsedS), mean);
    }
    double check = water.temperatureCheckDegC();
    Source source = Double.isNaN(check) ? Source.UNKNOWN : Source.CHECK;
    return new WaterTemperature(source, new double[] {check}, mean);
  }
}
