package org.crossreach.ingest;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Times are read as RFC 3339 defines them, exactly to the nanosecond. */
class Rfc3339Test {

  private final Rfc3339 time = new Rfc3339();

  private boolean parse(String text) {
    String around = "9" + text + "9"; // characters beyond the slice must not be read
    return time.parse(around.toCharArray(), 1, 1 + text.length());
  }

  /** Source: RFC 3339, section 5.8, the examples without a leap second, with what is said there. */
  @Test
  void readsTheExamplesOfTheStandard() {
    assertTrue(parse("1985-04-12T23:20:50.52Z"));
    assertEquals(
        OffsetDateTime.of(1985, 4, 12, 23, 20, 50, 520_000_000, ZoneOffset.UTC),
        time.toOffsetDateTime());
    assertTrue(parse("1996-12-19T16:39:57-08:00"));
    long pacific = time.epochSecond();
    assertTrue(parse("1996-12-20T00:39:57Z"));
    assertEquals(pacific, time.epochSecond());
    assertTrue(parse("1937-01-01T12:00:27.87+00:20"));
    assertEquals("1937-01-01T12:00:27.870+00:20", time.toOffsetDateTime().toString());
  }

  @Test
  void agreesWithTheJavaCalendar() {
    Random random = new Random(3339);
    DateTimeFormatter written = DateTimeFormatter.ISO_OFFSET_DATE_TIME;
    long first = OffsetDateTime.parse("0001-01-01T00:00:00Z").toEpochSecond();
    long last = OffsetDateTime.parse("9998-12-31T00:00:00Z").toEpochSecond();
    for (int i = 0; i < 200_000; i++) {
      long second = first + (long) (random.nextDouble() * (last - first));
      int nano = random.nextBoolean() ? random.nextInt(1_000_000_000) : 0;
      ZoneOffset offset = ZoneOffset.ofTotalSeconds(60 * (random.nextInt(2161) - 1080));
      OffsetDateTime expected =
          OffsetDateTime.ofInstant(java.time.Instant.ofEpochSecond(second, nano), offset);
      String text = written.format(expected);
      assertTrue(parse(text), text);
      assertEquals(second, time.epochSecond(), text);
      assertEquals(nano, time.nano(), text);
      assertEquals(expected, time.toOffsetDateTime(), text);
    }
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "2000-02-29T00:00:00Z",
        "2032-02-29t00:00:00z",
        "2031-04-18 09:30:00-00:00",
        "0000-01-01T00:00:00Z",
        "9999-12-31T23:59:59.999999999+18:00"
      })
  void readsTheForms(String text) {
    assertTrue(parse(text));
    assertEquals(
        OffsetDateTime.parse(text.replace(' ', 'T').replace("-00:00", "Z")).toInstant(),
        time.toOffsetDateTime().toInstant());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "2031-04-18",
        "2031-04-18T09:30:00",
        "2031-04-18T09:30Z",
        "2031-04-18T09:30:00.Z",
        "2031-04-18T09:30:00,5Z",
        "2031-04-18T09:30:00.1234567890Z",
        "2031-04-18T09:30:00+0100",
        "2031-04-18T09:30:00+01",
        "2031-04-18T09:30:00+19:00",
        "2031-04-18T09:30:00+01:60",
        "2031-04-18T09:30:60Z",
        "2031-04-18T24:00:00Z",
        "2031-04-31T09:30:00Z",
        "2031-02-29T09:30:00Z",
        "1900-02-29T09:30:00Z",
        "2031-00-18T09:30:00Z",
        "2031-13-18T09:30:00Z",
        "2031-04-00T09:30:00Z",
        "2031/04/18T09:30:00Z",
        "18-04-2031T09:30:00Z",
        "2031-04-18T09:30:00ZZ",
        "2031-04-18T09:30:00 Z",
        "+2031-04-18T09:30:00Z",
        "2031-04-1xT09:30:00Z",
        "x031-04-18T09:30:00Z"
      })
  void leavesOutWhatIsNoTime(String text) {
    assertFalse(parse(text));
  }
}
