/** What several subjects of the physics share: interpolation in tables, and limits of practice. The subjects stand in packages of their own. */
package org.treadwarm.physics;
