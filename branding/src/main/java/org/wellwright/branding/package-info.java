/** The name and the house look: chart theme and colour scales. */
package org.wellwright.branding;
