/** The commands of the program. */
package org.treadwarm.commands;
