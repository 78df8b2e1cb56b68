/**
 * The survey: the one document of a job, as records whose components are the document's keys, and what must hold between
 * its parts. Names are the document's; a component that is an {@code Optional} or a list may be left out, one with a
 * fallback is filled with it, every other is required.
 */
package org.treadwarm.survey;
