package org.treadwarm.wire;

import java.util.List;
import java.util.Map;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Working;
import org.treadwarm.survey.Survey;
import org.treadwarm.tables.Formulas;
import org.treadwarm.tables.Formulas.Formula;

/**
 * One number of an answer with its formula, where the formula comes from, and the addresses of what went in.
 *
 * @param address pointer of the number in the answer
 * @param formula the equation it satisfies
 * @param words what the formula says
 * @param source the standard and its clause
 * @param symbols addresses of what each symbol stands for
 */
public record WorkingAnswer(
        String address, String formula, String words, String source, Map<String, List<String>> symbols) {
    /** The working of a sizing, number by number. */
    public static List<WorkingAnswer> of(Survey survey, Sizing sizing) {
        return Working.of(survey, sizing).stream()
                .map(step -> {
                    Formula formula = Formulas.find(step.formula()).orElseThrow();
                    return new WorkingAnswer(
                            step.address(), formula.formula(), formula.words(), formula.source(), step.symbols());
                })
                .toList();
    }
}
