package dev.nearlimit.shortlist;

import dev.nearlimit.simulation.search.ErrorRateMeter;

/** Makes the meter that counts a contender's errors: a simulation in production, a known error rate in tests. */
@FunctionalInterface
interface MeterFactory {
    ErrorRateMeter meter(Contender contender);
}
