package org.wellwright.solver.service;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.openide.util.Lookup;

class SolverServiceTest {
    @Test
    void isFoundThroughTheLookup() {
        assertThat(Lookup.getDefault().lookup(SolverService.class)).isNotNull();
        assertThat(Lookup.getDefault().lookup(SolverService.class).id()).isEqualTo("spectral-elements");
    }
}
