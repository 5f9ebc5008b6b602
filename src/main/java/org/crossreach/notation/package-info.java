/**
 * How values and times are written.
 *
 * <p>Comes in: texts, numbers and lists. Goes out: UTF-8 that reads back as the same values on
 * every machine. Start at {@link org.crossreach.notation.JsonText}. Every package may use this one;
 * it knows no other.
 */
package org.crossreach.notation;
