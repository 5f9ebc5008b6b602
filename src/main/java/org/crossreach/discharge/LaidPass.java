package org.crossreach.discharge;

import org.crossreach.section.Section;
import org.crossreach.survey.Pass;

/**
 * A pass with its section: everything that does not depend on laws, exponent and method.
 *
 * @param pass what was recorded
 * @param section the pass on its line
 */
public record LaidPass(Pass pass, Section section) {}
