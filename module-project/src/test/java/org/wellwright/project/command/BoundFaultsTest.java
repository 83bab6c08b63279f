package org.wellwright.project.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Bad usage of {@code bound}: status 2, nothing on standard output, one line that names the fault. */
class BoundFaultsTest {
    private static void refused(CommandRun run, String words) {
        assertThat(run.err()).contains(words).startsWith("wellwright-batch: ").doesNotContain("\tat ");
        assertThat(run.err().lines()).hasSize(1);
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            quoteCharacter = '`',
            value = {
                "--formula -1/q; --kinetic 0.5; formula's q has no value",
                "--formula -a/r; --kinetic 0.5 --set b=1; no parameter 'b'",
                "--formula -a/r; --kinetic 0.5 --set a=1 --set a=2; given twice",
                "--formula -a/r; --kinetic 0.5 --set a=x; not a number",
                "--formula -a/r; --kinetic 0.5 --set a=inf; not a",
                "--formula -a/r; --kinetic 0.5 --set a; write --set NAME=VALUE",
                "--formula -1//r; --kinetic 0.5; column 4",
                "--formula -1/r); --kinetic 0.5; column 5",
                "--formula -1/r; --kinetic -0.5; not positive",
                "--formula -1/r; --kinetic 0; not positive",
                "--formula -1/r; --kinetic 1d; not a number",
                "--formula -1/r; --kinetic 1e999; not a finite number",
                "--formula -1/r; --kinetic nan; not a number",
                "--formula -1/r; --reduced-mass -1 --units atomic; not positive",
                "--formula -1/r; --reduced-mass 1; needs units",
                "--formula -1/r; --reduced-mass 1 --units atomc; use one of atomic",
                "--formula -1/r; --pair e-,x --units atomic; 'x' is not known",
                "--formula -1/r; --pair e- --units atomic; two",
                "--formula -1/r; --pair e-,p --kinetic 1 --units atomic; more than one way",
                "--formula -1/r; ; masses are not given",
                "--formula -1/r; --kinetic 0.5 --l 3..1; runs backwards",
                "--formula -1/r; --kinetic 0.5 --l -1; from 0",
                "--formula -1/r; --kinetic 0.5 --l 1,1; twice",
                "--formula -1/r; --kinetic 0.5 --l 0..9999; more than 1000",
                "--formula -1/r; --kinetic 0.5 --count 0; from 1",
                "--formula -1/r; --kinetic 0.5 --count 2.5; whole number",
                "--formula -1/r; --kinetic 0.5 --range 5,1; 0 <= R1 < R2",
                "--formula -1/r; --kinetic 0.5 --range 5; two radii",
                "--formula -1/r; --kinetic 0.5 --tolerance 2; from 0 to 1",
                "--formula -1/r; --kinetic 0.5 --format xml; use table, csv or json",
                "--formula -1/r; --kinetic 0.5 --kinetc 1; --kinetic",
                "--formula -1/r; --kinetic 0.5 extra; no use for 'extra'",
                "--formula -1/r; --kinetic; needs a value",
            })
    void areNamed(String formula, String options, String words) {
        List<String> arguments = new ArrayList<>(List.of("bound"));
        arguments.addAll(Arrays.asList(formula.split(" ")));
        if (options != null) {
            arguments.addAll(Arrays.asList(options.split(" ")));
        }
        refused(CommandRun.of(arguments.toArray(new String[0])), words);
    }

    @Test
    void formulaIsNeeded() {
        refused(CommandRun.of("bound", "--kinetic", "1"), "needs --formula");
    }

    @Test
    void unknownCommandIsCorrected() {
        refused(CommandRun.of("bond"), "did you mean bound");
        refused(CommandRun.of("quite-different"), "use one of bound");
    }

    @Test
    void longNestingAndLongTextsAreRefusedQuickly() {
        String nested = "(".repeat(100_000) + "r" + ")".repeat(100_000);
        CommandRun run = CommandRun.of("bound", "--formula", nested, "--kinetic", "1");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.err().lines()).hasSize(1);
        assertThat(run.err().length()).isLessThan(400);
    }

    @Test
    void debugShowsWhere() {
        CommandRun run = CommandRun.of("bound", "--formula", "1//r", "--kinetic", "1", "--debug");
        assertThat(run.status()).isEqualTo(2);
        assertThat(run.err()).contains("\tat org.wellwright");
    }

    @Test
    void helpGoesToStandardOutput() {
        CommandRun run = CommandRun.of("bound", "--help");
        assertThat(run.status()).isZero();
        assertThat(run.out()).contains("--formula TEXT").contains("-o FILE");
        assertThat(CommandRun.of("--help").out()).contains("  bound ");
        assertThat(CommandRun.of("--version").out()).startsWith("Wellwright ");
        assertThat(CommandRun.of().status()).isEqualTo(2);
    }
}
