/** The implementations that the Lookup gives for the interfaces of {@code service}. Nobody else knows them. */
package org.wellwright.solver.service.internal;
