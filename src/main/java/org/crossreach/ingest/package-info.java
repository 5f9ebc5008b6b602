/**
 * Reads a measurement's folder: ensemble CSV, {@code measurement.json} and {@code settings.json}.
 *
 * <p>Comes in: a folder of files that anybody may have written. Goes out: a {@link
 * org.crossreach.survey.Measurement} and {@link org.crossreach.settings.Settings}, or every problem
 * of every file with its place. Start at {@link org.crossreach.ingest.MeasurementFolder}. The
 * commands, the batch and the simulator may call it; it knows the facts and the choices only.
 */
package org.crossreach.ingest;
