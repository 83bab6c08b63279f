/**
 * What other modules look up: the solver and the fit behind interfaces. Implementations are in
 * {@code service.internal}.
 */
package org.wellwright.solver.service;
