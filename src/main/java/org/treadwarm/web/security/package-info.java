/** Who may do what: host names, keys, sessions, forms, and the headers that keep browsers careful. */
package org.treadwarm.web.security;
