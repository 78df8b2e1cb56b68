/** One binder behind two doors, JSON and form fields: a survey, or the complete list of what stands in its way. */
package org.treadwarm.intake;
