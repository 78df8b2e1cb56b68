package org.treadwarm.web.pages;

/** One line of the summary: where it leads in the page, and what is wrong. */
public record ErrorView(String target, String where, String message, String allowed) {}
