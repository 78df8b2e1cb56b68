package org.treadwarm.checks;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.treadwarm.checks.CheckCase.Expected;

/** The published values beside what the program makes of them, computed anew at each call. */
public final class PublishedChecks {
    private static final Map<CaseSet, List<CheckCase>> CASES = cases();

    private PublishedChecks() {}

    /**
     * Every published value, in the order of the files.
     *
     * @throws IllegalStateException when a case has no computation, or a computation no case
     */
    public static List<CheckedValue> all() {
        return all(() -> false, share -> {});
    }

    /**
     * The same, with a way to stop between two cases.
     *
     * @param stopped asked before every case whether to give up
     * @param progress told after every case what share is done
     * @throws CancellationException when asked to give up
     */
    public static List<CheckedValue> all(BooleanSupplier stopped, DoubleConsumer progress) {
        List<CheckCase> cases = CASES.values().stream().flatMap(List::stream).toList();
        Bindings.check(cases);
        List<CheckedValue> values = new ArrayList<>();
        for (int i = 0; i < cases.size(); i++) {
            if (stopped.getAsBoolean()) {
                throw new CancellationException("stopped while checking published values");
            }
            values(cases.get(i)).forEach(values::add);
            progress.accept((i + 1.0) / cases.size());
        }
        return List.copyOf(values);
    }

    /** The cases of a set. */
    public static List<CheckCase> cases(CaseSet set) {
        return CASES.get(set);
    }

    /** The published cases on a set's subjects that are not run, with the reasons; none for many sets. */
    public static List<LeftOut> leftOut(CaseSet set) {
        return CaseFile.leftOut(set);
    }

    private static Map<CaseSet, List<CheckCase>> cases() {
        Map<CaseSet, List<CheckCase>> cases = new EnumMap<>(CaseSet.class);
        for (CaseSet set : CaseSet.values()) {
            cases.put(set, CaseFile.cases(set));
        }
        return cases;
    }

    private static Stream<CheckedValue> values(CheckCase given) {
        Map<String, double[]> got = Bindings.of(given.id()).compute(given.inputs()).entrySet().stream()
                .collect(Collectors.toMap(
                        Map.Entry::getKey, entry -> entry.getValue().toArray()));
        Set<String> names = given.expected().stream().map(Expected::name).collect(Collectors.toSet());
        if (!got.keySet().equals(names)) {
            throw new IllegalStateException(given.id() + " expects " + names + " and got " + got.keySet());
        }
        return given.expected().stream().map(expected -> value(given, expected, got.get(expected.name())));
    }

    private static CheckedValue value(CheckCase given, Expected expected, double[] got) {
        if (got.length != expected.count()) {
            throw new IllegalStateException(given.id() + " expects " + expected.count() + " numbers of "
                    + expected.name() + " and got " + got.length);
        }
        return new CheckedValue(
                given.id(),
                expected.what(),
                given.standard(),
                given.clause(),
                given.source(),
                given.confidence(),
                expected.value(),
                got[expected.index()],
                expected.tolerance());
    }
}
