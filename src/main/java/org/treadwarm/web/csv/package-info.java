/** Rooms, openings and results as CSV (RFC 4180), out of a job and into it. */
package org.treadwarm.web.csv;
