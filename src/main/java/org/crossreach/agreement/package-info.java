/**
 * How well the passes of a measurement agree, and what a person should look at.
 *
 * <p>Comes in: a reduction. Goes out: a {@link org.crossreach.agreement.Result}, the reduction with
 * its {@link org.crossreach.agreement.Summary}. Start at {@link
 * org.crossreach.agreement.Result#of}. Called by {@code report} and what follows it.
 */
package org.crossreach.agreement;
