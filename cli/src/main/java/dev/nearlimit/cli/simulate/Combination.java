package dev.nearlimit.cli.simulate;

import dev.nearlimit.simulation.Scheme;
import java.util.List;

/**
 * One place in a sweep.
 *
 * @param values one for each swept setting, in their order
 * @param scheme what is measured there
 */
record Combination(List<String> values, Scheme scheme) {}
