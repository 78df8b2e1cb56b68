/** The server, and the only place with HTTP: the API, the pages and what guards them. */
package org.treadwarm.web;
