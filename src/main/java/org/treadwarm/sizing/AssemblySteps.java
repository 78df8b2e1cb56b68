package org.treadwarm.sizing;

import java.util.List;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.sizing.Plan.AssemblyPlan;
import org.treadwarm.sizing.Plan.Side;
import org.treadwarm.sizing.Sizing.AssemblySizing;
import org.treadwarm.sizing.Sizing.SideSizing;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Pointer;

/** Steps of the assemblies: layers, films, limits and U towards each kind of other side. */
final class AssemblySteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final LayerSteps layers;
    private final FilmSteps films;

    AssemblySteps(Plan plan, Addresses addresses, Steps steps) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.layers = new LayerSteps(addresses, steps);
        this.films = new FilmSteps(addresses, steps);
    }

    void all(List<AssemblySizing> answers) {
        int i = 0;
        for (Assembly given : plan.survey.assemblies().values()) {
            AssemblyPlan assembly = plan.assemblies.get(i);
            String at = "/assemblies/" + i;
            HeatFlow direction = given.heatFlow().heatFlow();
            String from = Pointer.to("/assemblies", assembly.name()) + "/layers";
            layers.resistances(from, at + "/layers", given.layers(), direction);
            List<SideSizing> sides = answers.get(i).sides();
            for (int k = 0; k < sides.size(); k++) {
                side(at, at + "/sides/" + k, assembly, direction, sides.get(k));
            }
            i++;
        }
    }

    private void side(String assemblyAt, String at, AssemblyPlan assembly, HeatFlow direction, SideSizing answer) {
        if (assembly.stack() == Stack.NONE) {
            steps.add(
                    at + "/uValue", "u-value-as-given", "U", Symbol.of("U_given", addresses.input(assembly.uValue())));
            return;
        }
        List<String> both = List.of();
        if (answer.insideFilm().isPresent()) {
            films(at, assembly, direction, answer.side().equals(Side.OUTDOORS.word));
            both = List.of(Addresses.sizing(at + "/insideFilm"), Addresses.sizing(at + "/outsideFilm"));
        }
        layers.limits(
                at + "/upperLimit",
                at + "/lowerLimit",
                plan.stacks.get(assembly.stack()),
                both,
                assemblyAt + "/layers");
        results(at, answer);
    }

    private void results(String at, SideSizing answer) {
        Symbol upper = Symbol.of("R_upper", Addresses.sizing(at + "/upperLimit"));
        Symbol lower = Symbol.of("R_lower", Addresses.sizing(at + "/lowerLimit"));
        if (answer.largestRelativeError().isPresent()) {
            steps.add(at + "/largestRelativeError", "largest-relative-error", "e", upper, lower);
        }
        steps.add(at + "/resistance", "total-resistance", "R_T", upper, lower);
        if (answer.uValue().isPresent()) {
            steps.add(at + "/uValue", "u-value", "U", Symbol.of("R_T", Addresses.sizing(at + "/resistance")));
        }
    }

    private void films(String at, AssemblyPlan assembly, HeatFlow direction, boolean outdoors) {
        films.film(at + "/insideFilm", assembly.insideCoefficient(), TableNumbers.insideFilm(direction));
        if (outdoors) {
            films.film(at + "/outsideFilm", assembly.outsideCoefficient(), TableNumbers.outsideFilm(direction));
        } else {
            steps.add(
                    at + "/outsideFilm",
                    "film-of-both-faces",
                    "R_se",
                    Symbol.of("R_si", Addresses.sizing(at + "/insideFilm")));
        }
    }
}
