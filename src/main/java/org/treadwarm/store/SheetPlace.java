package org.treadwarm.store;

/**
 * Where a sheet stands in the list of all.
 *
 * @param year the year it was issued in, UTC
 * @param running its number within that year, from 1
 */
public record SheetPlace(int year, int running) {
    /** The place of the sheet with this number, which is its year, a hyphen and its number in it. */
    public static SheetPlace of(String number) {
        int hyphen = number.indexOf('-');
        return new SheetPlace(
                Integer.parseInt(number.substring(0, hyphen)), Integer.parseInt(number.substring(hyphen + 1)));
    }
}
