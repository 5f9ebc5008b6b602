package org.crossreach.screen;

/**
 * A run of ensembles without something.
 *
 * @param ensembles how many ensembles in a row
 * @param fromEnsemble recorded number of the first
 * @param toEnsemble recorded number of the last
 * @param durationS how long they took (s): from the end of the ensemble before, or the end of the
 *     first one where the pass begins with the run, to the end of the last one
 */
public record Run(int ensembles, long fromEnsemble, long toEnsemble, double durationS) {}
