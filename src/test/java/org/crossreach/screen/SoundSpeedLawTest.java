package org.crossreach.screen;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.crossreach.settings.SoundSpeedFormula;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Each formula for the speed of sound gives the values published for it.
 *
 * <p>Validation: the check value of Fofonoff and Millard 1983, UNESCO Technical Papers in Marine
 * Science 44, page 46 (page from memory); values recomputed from the published coefficients and
 * printed to four decimals; and the exact speed of sound of TEOS-10 (Gibbs SeaWater toolbox 3.6.16)
 * as an independent law.
 */
class SoundSpeedLawTest {

  private static final double FOUR_DECIMALS = 0.51e-4;

  @Test
  void chenMilleroGivesTheCheckValueOfUnesco44() {
    // S = 40, T68 = 40 deg C, p = 10 000 dbar: 1731.995 m/s
    assertEquals(1731.995, ChenMillero1977.metresPerSecond(40, 40, 1000), 0.5e-3);
  }

  @ParameterizedTest
  @CsvSource({
    // S, T68, p (dbar), c
    "35,0,0,1449.1388",
    "35,10,0,1489.8223",
    "25,0,0,1435.7899",
    "25,10,0,1477.6832",
    "25,20,0,1510.3139",
    "25,30,0,1535.2143",
    "25,40,0,1553.4451",
    "40,40,0,1568.1183",
    "30,10,1000,1500.2253",
    "5,15,0,1471.8567",
    "10,15,0,1477.6846",
    "20,15,0,1489.2627"
  })
  void chenMilleroGivesItsTable(double s, double t68, double dbar, double c) {
    assertEquals(c, ChenMillero1977.metresPerSecond(t68, s, dbar / 10), FOUR_DECIMALS);
  }

  @ParameterizedTest
  @CsvSource({
    // T, Marczak, Chen-Millero S=0, Medwin S=0, TEOS-10 exact
    "0,1402.3850,1402.3880,1402.3000,1402.4010",
    "5,1426.1695,1426.1623,1425.7113,1426.1797",
    "10,1447.2890,1447.2703,1446.5900,1447.2842",
    "15,1465.9599,1465.9310,1465.1537,1465.9383",
    "20,1482.3795,1482.3433,1481.6200,1482.3528",
    "25,1496.7277,1496.6878,1496.2062,1496.7087",
    "30,1509.1672,1509.1273,1509.1300,1509.1612",
    "40,1528.8936,1528.8634,1530.8600,1528.9124"
  })
  void freshWaterTable(double t, double marczak, double chenMillero, double medwin, double teos10) {
    assertEquals(marczak, new Marczak1997().metresPerSecond(t, 0), FOUR_DECIMALS);
    assertEquals(chenMillero, ChenMillero1977.metresPerSecond(t, 0, 0), FOUR_DECIMALS);
    assertEquals(medwin, Medwin1975.metresPerSecond(t, 0, 0), FOUR_DECIMALS);
    // The largest differences of the table: 0.027 and 0.034 m/s, 0.0023 % of the speed.
    assertEquals(teos10, new Marczak1997().metresPerSecond(t, 0), 0.03);
    assertEquals(teos10, new ChenMillero1977().metresPerSecond(t, 0), 0.05);
  }

  @ParameterizedTest
  @CsvSource({"10,35,0,1489.9900", "20,35,100,1523.1200", "25,35,1000,1550.3563"})
  void medwinGivesItsTable(double t, double s, double depth, double c) {
    assertEquals(c, Medwin1975.metresPerSecond(t, s, depth), FOUR_DECIMALS);
  }

  @Test
  void chenMilleroAgreesWithTeos10InBrackishAndSeaWater() {
    // Absolute salinity 35.16504 g/kg is practical salinity 35; 0.5 g/kg is 0.4977.
    // TEOS-10 and UNESCO 44 are known to differ by a few cm/s near the surface.
    ChenMillero1977 law = new ChenMillero1977();
    assertEquals(1489.7883, law.metresPerSecond(10, 35), 0.05);
    assertEquals(1521.4791, law.metresPerSecond(20, 35), 0.05);
    assertEquals(1466.5432, law.metresPerSecond(15, 0.4977), 0.05);
  }

  @Test
  void marczakHasItsMaximumWhereItIsPublished() {
    // 1555.1402 m/s at 74.17 deg C
    assertEquals(1555.1402, new Marczak1997().metresPerSecond(74.17, 0), FOUR_DECIMALS);
  }

  @Test
  void waterChoosesTheFormula() {
    assertEquals(
        SoundSpeedFormula.MARCZAK_1997, SoundSpeedLaws.chosen(SoundSpeedFormula.AUTO, 0.0));
    assertEquals(
        SoundSpeedFormula.CHEN_MILLERO_1977, SoundSpeedLaws.chosen(SoundSpeedFormula.AUTO, 3.0));
    assertEquals(
        SoundSpeedFormula.MEDWIN_1975, SoundSpeedLaws.chosen(SoundSpeedFormula.MEDWIN_1975, 3.0));
  }

  @ParameterizedTest
  @CsvSource({"MARCZAK_1997", "CHEN_MILLERO_1977", "MEDWIN_1975", "AUTO"})
  void everyChoiceHasALaw(SoundSpeedFormula formula) {
    SoundSpeedLaw law = SoundSpeedLaws.of(formula, 0);
    assertTrue(law.covers(15, 0));
    // Fresh water at 15 deg C to within what the formulas differ by.
    assertEquals(1465.9, law.metresPerSecond(15, 0), 0.8);
  }

  @Test
  void knowsItsRange() {
    assertFalse(new Marczak1997().covers(15, 5));
    assertFalse(new ChenMillero1977().covers(45, 5));
    assertFalse(new Medwin1975().covers(-1, 5));
  }
}
