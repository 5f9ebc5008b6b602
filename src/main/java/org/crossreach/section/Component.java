package org.crossreach.section;

/** A horizontal component of velocity in the section's axes. */
public enum Component {
  /** Normal to the section, positive downstream. */
  NORMAL,
  /** Along the section, positive from the left to the right bank. */
  ALONG
}
