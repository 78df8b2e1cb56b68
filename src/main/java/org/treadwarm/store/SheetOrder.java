package org.treadwarm.store;

import java.util.Optional;

/**
 * What is to be issued.
 *
 * @param jobId the job
 * @param revision its revision that the content was made from
 * @param content what is frozen
 * @param replaces the number of the sheet of the same job that the new one replaces, if any
 */
public record SheetOrder(String jobId, long revision, SheetContent content, Optional<String> replaces) {}
