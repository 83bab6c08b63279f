/** Tests of the packaged application: what lies in its folder, what its two launchers do. */
package org.wellwright.application;
