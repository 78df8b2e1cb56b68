package org.treadwarm.survey;

/** What must hold for the air that a room or space exchanges with outdoors. */
final class AirRules {
    private final Findings findings;

    AirRules(Findings findings) {
        this.findings = findings;
    }

    void check(Place at, Air air) {
        int ways = (air.changeRate().isPresent() ? 1 : 0)
                + (air.flow().isPresent() ? 1 : 0)
                + (air.supply().isPresent() ? 1 : 0);
        boolean judged =
                findings.clean(at, "/changeRate") && findings.clean(at, "/flow") && findings.clean(at, "/supply");
        if (ways != 1 && judged) {
            findings.add(
                    at.pointer(),
                    ways + " of them",
                    "the air is known by one of a change rate, a flow, or a supply with recovery",
                    "exactly one of changeRate; flow; supply with recovery");
        }
        if (air.supply().isPresent() && air.recovery().isEmpty()) {
            findings.missing(at, "/recovery", "a supply needs the share of heat recovered", "0 to 1");
        }
        if (air.supply().isEmpty() && air.recovery().isPresent() && judged) {
            findings.add(
                    at,
                    "/recovery",
                    air.recovery().get().typed(),
                    "heat is recovered only from a supply",
                    "leave it out, or give the supply");
        }
    }
}
