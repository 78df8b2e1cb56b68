/** Jobs: surveys under a name, kept piece by piece in the store and sized when asked. */
package org.treadwarm.jobs;
