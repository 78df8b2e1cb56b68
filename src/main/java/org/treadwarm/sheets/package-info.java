/** Issued sheets: a job's sizing is frozen under a number, verified by today's method, withdrawn and replaced. */
package org.treadwarm.sheets;
