package org.crossreach.report.result;

import java.io.IOException;
import org.crossreach.discharge.ZoneDischarge;
import org.crossreach.notation.JsonText;

/** Discharges by zone as members (m³/s). */
final class ZonesObject {

  private ZonesObject() {}

  static void members(ZoneDischarge zones, JsonText json) throws IOException {
    json.number("top", zones.top());
    json.number("measured", zones.measured());
    json.number("bottom", zones.bottom());
    json.number("left_edge", zones.leftEdge());
    json.number("right_edge", zones.rightEdge());
  }
}
