package org.treadwarm.store;

import java.sql.SQLException;
import java.util.Optional;
import java.util.stream.Stream;

/** Finds what the database said behind the exceptions of the libraries in between. */
final class Failures {
    private Failures() {}

    /** The first failure of the database among the causes. */
    static Optional<SQLException> of(Throwable problem) {
        return all(problem).findFirst();
    }

    /** What the failure means, told by the first cause that the engine can explain. */
    static Optional<String> explain(Engine engine, Throwable problem) {
        return all(problem).map(engine::explain).flatMap(Optional::stream).findFirst();
    }

    /** All failures of the database among the causes, the outermost first. */
    static Stream<SQLException> all(Throwable problem) {
        return Stream.iterate(problem, cause -> cause != null, Throwable::getCause)
                .filter(SQLException.class::isInstance)
                .map(SQLException.class::cast);
    }
}
