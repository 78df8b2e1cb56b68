package org.treadwarm.web;

import java.util.stream.Collectors;
import java.util.stream.Stream;

/**
 * Where something went wrong, for the log: kinds of exceptions and places in the program, in one line. Messages are left
 * out, since they may quote what people typed; those of the database libraries quote whole rows.
 */
public final class Traces {
    private static final int MOST_CAUSES = 5;
    private static final int MOST_PLACES = 15;

    private Traces() {}

    /** The line. */
    public static String of(Throwable problem) {
        return Stream.iterate(problem, cause -> cause != null, Throwable::getCause)
                .limit(MOST_CAUSES)
                .map(cause -> cause.getClass().getName() + places(cause))
                .collect(Collectors.joining("; caused by "));
    }

    private static String places(Throwable problem) {
        return Stream.of(problem.getStackTrace())
                .limit(MOST_PLACES)
                .map(place -> place.getClassName() + "." + place.getMethodName() + ":" + place.getLineNumber())
                .collect(Collectors.joining(" < ", " at ", ""));
    }
}
