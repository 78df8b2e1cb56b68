/** The API under /api/v1: what the firm's quoting system asks. */
package org.treadwarm.web.api;
