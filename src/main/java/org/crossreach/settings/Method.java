package org.crossreach.settings;

/** How velocities become discharge. */
public enum Method implements Choice {
  /** Velocity normal to the section times the boat's progress along it. */
  SECTION_NORMAL("section-normal"),
  /** Flux through the boat's own path: the cross product of water and boat velocity. */
  PATH_FLUX("path-flux");

  private final String key;

  Method(String key) {
    this.key = key;
  }

  @Override
  public String key() {
    return key;
  }
}
