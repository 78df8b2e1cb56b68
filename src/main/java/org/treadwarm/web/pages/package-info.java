/** The pages: forms made from the survey's own declarations, and the answers beside them. Every one works without script. */
package org.treadwarm.web.pages;
