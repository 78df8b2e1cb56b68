package org.treadwarm.store;

/** What became of an attempt to change somebody's account. */
public sealed interface TeamChange {
    /** It is done; the person as now kept. */
    record Done(Person person) implements TeamChange {}

    /** It was not done: nobody would be left who is an owner. */
    record LastOwner() implements TeamChange {}

    /** There is no open account of this person. */
    record Missing() implements TeamChange {}
}
