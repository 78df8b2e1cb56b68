/**
 * Drawings: plain data in, SVG text out.
 *
 * <p>Every drawing is one sheet with a given width in pixels, a title and a description in words, and only
 * presentation attributes, so that it can be put into a page that forbids inline styles and scripts. Nothing in this
 * package calculates heat; it draws the numbers it is given.
 */
package org.treadwarm.draw;
