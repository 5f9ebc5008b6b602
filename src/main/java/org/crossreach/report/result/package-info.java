/**
 * The result JSON, {@code crossreach-result/1}.
 *
 * <p>Comes in: a result with its agreement. Goes out: JSON, one part for each key of the outermost
 * object. Start at {@link org.crossreach.report.result.ResultJson}. Called by {@code report},
 * {@code archive} and {@code cli}.
 */
package org.crossreach.report.result;
