package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Rooms, held spaces, outdoors and ground at fixed temperatures; unheated spaces in between float. */
final class Network {
    private final JsonNode survey;
    private final List<Coupling> couplings;
    private final List<String> floating = new ArrayList<>();
    private final Map<String, Double> factors = new HashMap<>();

    Network(JsonNode survey) {
        this.survey = survey;
        this.couplings = Couplings.of(survey);
        survey.path("spaces").properties().forEach(space -> {
            if (space.getValue().has("temperatureFactor")) {
                factors.put(space.getKey(), Fields.number(space.getValue(), "temperatureFactor"));
            } else if (Fields.text(space.getValue(), "kind").equals("unheated")) {
                floating.add(space.getKey());
            }
        });
    }

    List<Coupling> couplings() {
        return couplings;
    }

    /** Names of the floating spaces in survey order. */
    List<String> floating() {
        return floating;
    }

    /** All temperatures when it is {@code outdoor} °C outside. */
    Conditions at(double outdoor) {
        Map<String, Double> temperatures = fixed(outdoor);
        double[] solved = balance(temperatures);
        for (int index = 0; index < floating.size(); index++) {
            temperatures.put(floating.get(index), solved[index]);
        }
        return new Conditions(outdoor, temperatures, factors);
    }

    private Map<String, Double> fixed(double outdoor) {
        Map<String, Double> temperatures = new HashMap<>();
        temperatures.put(Couplings.OUTDOORS, outdoor);
        if (survey.get("site").has("annualMeanTemperature")) {
            temperatures.put(Couplings.GROUND, Fields.number(survey.get("site"), "annualMeanTemperature"));
        }
        for (JsonNode room : Fields.list(survey, "rooms")) {
            temperatures.put(Fields.text(room, "name"), Fields.number(room, "indoorTemperature"));
        }
        survey.path("spaces").properties().forEach(space -> {
            if (Fields.text(space.getValue(), "kind").equals("held")) {
                temperatures.put(space.getKey(), Fields.number(space.getValue(), "temperature"));
            }
        });
        return temperatures;
    }

    /** For each floating space: sum of conductance x (own temperature - other temperature) = 0. */
    private double[] balance(Map<String, Double> fixed) {
        double[][] matrix = new double[floating.size()][floating.size()];
        double[] right = new double[floating.size()];
        for (Coupling coupling : couplings) {
            addTo(matrix, right, fixed, coupling, coupling.from(), coupling.to());
            addTo(matrix, right, fixed, coupling, coupling.to(), coupling.from());
        }
        return LinearSystem.solve(matrix, right);
    }

    private void addTo(
            double[][] matrix, double[] right, Map<String, Double> fixed, Coupling coupling, String own, String other) {
        int row = floating.indexOf(own);
        if (row < 0) {
            return;
        }
        matrix[row][row] += coupling.conductance();
        if (floating.contains(other)) {
            matrix[row][floating.indexOf(other)] -= coupling.conductance();
        } else {
            right[row] += coupling.conductance() * fixed.get(other);
        }
    }
}
