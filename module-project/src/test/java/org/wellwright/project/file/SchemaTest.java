package org.wellwright.project.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.wellwright.solver.units.UnitSystem;

/**
 * The published schema and the reader say the same, judged by a general-purpose validator (JSON Schema draft 2020-12).
 */
class SchemaTest {
    private static final Schema SCHEMA = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
            .getSchema(SchemaTest.class.getResourceAsStream("wellwright-project-1.schema.json"));

    private static boolean accepted(String json) {
        return SCHEMA.validate(json, InputFormat.JSON).isEmpty();
    }

    @Test
    void acceptsTheFileThatUsesEveryKey() throws IOException {
        assertThat(SCHEMA.validate(ProjectFileTest.sample("everything-1.wellwright"), InputFormat.JSON))
                .isEmpty();
    }

    @Test
    void namesEveryKeyThatTheWriterWrites() throws IOException {
        String text = ProjectFileTest.sample("everything-1.wellwright");
        String schema = new String(
                SchemaTest.class
                        .getResourceAsStream("wellwright-project-1.schema.json")
                        .readAllBytes(),
                StandardCharsets.UTF_8);
        var known = java.util.Set.of(
                "x-lab",
                "cell",
                "warm",
                "runs",
                "colour",
                "plate",
                "laboratory",
                "as",
                "axis",
                "org.wellwright.viewer.levels",
                "c",
                "d",
                "strength",
                "range");
        var keys = java.util.regex.Pattern.compile("\"([^\"]+)\": ").matcher(text);
        int seen = 0;
        while (keys.find()) {
            if (!known.contains(keys.group(1))) {
                assertThat(schema).contains("\"" + keys.group(1) + "\":");
                seen++;
            }
        }
        assertThat(seen).isGreaterThan(150);
    }

    @Test
    void listsEveryUnitSystem() throws IOException {
        String text = ProjectFileTest.sample("everything-1.wellwright");
        for (UnitSystem system : UnitSystem.ALL) {
            assertThat(accepted(text.replace("\"units\": \"eV-nm\"", "\"units\": \"" + system.id() + "\"")))
                    .as(system.id())
                    .isTrue();
        }
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "\"value\": 1.440, | \"value\": \"big\",",
                "\"value\": 1.440, | \"valu\": 1.440,",
                "\"name\": \"a\", | \"name\": \"2a\",",
                "\"sigma\": 0.001} | \"sigma\": 0}",
                "\"tied\": \"2*a\" | \"tied\": \"2*a\", \"value\": 2",
                "\"permittivity\": 1.00, | \"permittivity\": 0,",
                "\"particle-antiparticle\" | \"twins\"",
                "\"formula\": \"-a/r*exp(-r/c)\" | \"formulae\": \"a\"",
                "[1.50, \"by_system\"] | [1.5]",
                "\"l\": \"1..3\" | \"l\": \"one\"",
                "\"sigma\": 0.0020, | \"sigma\": 0,",
                "\"version\": 1, | \"version\": 2,",
                "\"units\": \"eV-nm\" | \"units\": []",
                "\"from\": \"-5\" | \"from\": -5",
            })
    void refusesWhatTheReaderRefuses(String old, String replacement) throws IOException {
        String broken = ProjectFileTest.sample("everything-1.wellwright").replace(old, replacement);
        assertThat(accepted(broken)).isFalse();
        assertThatThrownBy(() -> ProjectFileTest.parse(broken)).isInstanceOf(ProjectFileException.class);
    }
}
