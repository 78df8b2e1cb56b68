package org.treadwarm.sheets;

import java.util.List;
import org.treadwarm.survey.Problem;

/**
 * A sheet computed anew from the survey it keeps.
 *
 * @param number the sheet
 * @param agrees whether the fingerprint is right and today's method gives the same answer
 * @param fingerprintHolds whether the kept texts have the fingerprint of the day of issue
 * @param fingerprint SHA-256 of the day of issue
 * @param fingerprintFound SHA-256 of what is kept now
 * @param methodVersion the method of the sheet
 * @param methodToday the method it was computed with now
 * @param compared how many values were compared
 * @param differences what today's method gives otherwise: numbers by more than 1e-9 of the larger one, all else at all
 * @param added addresses that only today's answer has; a method may gain fields
 * @param problems why today's program refuses the survey; then nothing was compared
 */
public record Verification(
        String number,
        boolean agrees,
        boolean fingerprintHolds,
        String fingerprint,
        String fingerprintFound,
        String methodVersion,
        String methodToday,
        int compared,
        List<Difference> differences,
        List<String> added,
        List<Problem> problems) {
    public Verification {
        differences = List.copyOf(differences);
        added = List.copyOf(added);
        problems = List.copyOf(problems);
    }

    /**
     * One value that differs.
     *
     * @param address a JSON Pointer into the sizing
     * @param issued the value on the sheet, as JSON writes it; "nothing" where it has none
     * @param today the value by today's method, in the same way
     */
    public record Difference(String address, String issued, String today) {}
}
