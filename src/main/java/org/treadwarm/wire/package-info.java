/** Answers and problems as JSON, the same from the program and from the API. */
package org.treadwarm.wire;
