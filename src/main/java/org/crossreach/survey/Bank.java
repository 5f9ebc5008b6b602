package org.crossreach.survey;

/** A river bank, named as seen when looking downstream. */
public enum Bank {
  LEFT,
  RIGHT
}
