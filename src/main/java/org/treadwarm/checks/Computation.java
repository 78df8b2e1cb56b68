package org.treadwarm.checks;

import java.util.Map;
import java.util.stream.DoubleStream;

/** The program's own computation that answers a case. */
@FunctionalInterface
interface Computation {
    /** What the program gives for the expected numbers, by their names. */
    Map<String, DoubleStream> compute(Inputs given);
}
