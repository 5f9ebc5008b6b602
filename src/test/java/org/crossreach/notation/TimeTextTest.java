package org.crossreach.notation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.time.OffsetDateTime;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * A time is written with its seconds, as RFC 3339, section 5.6 wants it ({@code partial-time =
 * time-hour ":" time-minute ":" time-second [time-secfrac]}).
 */
class TimeTextTest {

  @ParameterizedTest
  @ValueSource(
      strings = {
        "2031-04-18T09:30:00+01:00",
        "2031-04-18T00:00:00Z",
        "2031-04-18T09:30:07-03:30",
        "2031-04-18T09:30:00.250+01:00",
        "2031-04-18T09:30:00.000000001Z"
      })
  void keepsSecondsAndDecimals(String text) {
    assertEquals(text, TimeText.of(OffsetDateTime.parse(text)));
  }
}
