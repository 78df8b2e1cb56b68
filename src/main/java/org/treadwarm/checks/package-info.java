/**
 * Published values, each computed again by the program: the cases as data, and which of the program's computations answers
 * each case. No formula is written here a second time.
 */
package org.treadwarm.checks;
