package org.treadwarm.store;

/** What became of a request that must create no more than once. */
public sealed interface Once {
    /** It created something now; this is on disk together with it. */
    record Made(KeptAnswer answer) implements Once {}

    /** It was answered before, so nothing was created. */
    record Repeated(KeptAnswer answer) implements Once {}

    /** The same name was used for another request, so nothing was created. */
    record Different() implements Once {}

    /** It was refused, so nothing was created or kept. */
    record Nothing() implements Once {}
}
