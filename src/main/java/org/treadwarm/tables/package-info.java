/** The standards' and handbooks' tables, each row with its source: read once, never changed. */
package org.treadwarm.tables;
