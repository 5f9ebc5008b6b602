package org.crossreach.report.chart;

/**
 * Room around the plane of a picture for numbers, names of axes and keys (pt).
 *
 * @param left room at the left
 * @param right room at the right
 * @param above room above
 * @param below room below
 */
record Margins(double left, double right, double above, double below) {}
