/** Windows and figures that show results. */
package org.wellwright.viewer;
