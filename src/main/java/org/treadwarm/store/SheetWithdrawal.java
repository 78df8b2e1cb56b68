package org.treadwarm.store;

/** What became of an attempt to withdraw a sheet. */
public sealed interface SheetWithdrawal {
    /** It is withdrawn. */
    record Done(SheetHeader header) implements SheetWithdrawal {}

    /** It was withdrawn before; that stands as it was. */
    record DoneBefore(SheetHeader header) implements SheetWithdrawal {}

    /** There is no such sheet. */
    record Missing() implements SheetWithdrawal {}
}
