package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;

/**
 * One revision of a job, read and judged.
 *
 * @param id the job's id
 * @param revision its number
 * @param name the job's name
 * @param savedAt when it was saved
 * @param savedBy who saved it
 * @param note a few words, or empty
 * @param document the survey as it was typed; a copy, free to change
 * @param survey the survey, when it has no problems
 * @param problems what stands in the way of a sizing; empty for none
 */
public record Job(
        String id,
        long revision,
        String name,
        Instant savedAt,
        String savedBy,
        String note,
        JsonNode document,
        Optional<Survey> survey,
        List<Problem> problems) {
    /** Its sizing, when it has no problems; made anew at every call, which may take long where floors must be solved. */
    public Optional<Sizing> sizing() {
        return Judgement.of(document).sizing();
    }

    /** Whether problems stand in the way of a sizing. */
    public boolean draft() {
        return !problems.isEmpty();
    }
}
