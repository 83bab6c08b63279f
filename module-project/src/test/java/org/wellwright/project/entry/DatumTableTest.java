package org.wellwright.project.entry;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.units.ExactNumber;

class DatumTableTest {
    private static ModelDocument document(LabelConvention labels, String... systems) {
        List<PairSystem> pairs = List.of(systems).stream()
                .map(id ->
                        PairSystem.of(id, ParticleCatalogue.STANDARD.body("e-"), ParticleCatalogue.STANDARD.body("p")))
                .toList();
        DataGroup lamp = new DataGroup("lamp", "", DataGroup.Kind.PLAIN, null, "");
        return new ModelDocument(
                "",
                "",
                "spectroscopic",
                labels,
                Weighting.KNOWN,
                pairs,
                List.of(),
                List.of(),
                List.of(),
                List.of(lamp));
    }

    private static List<DatumTable.Outcome> read(String text, ModelDocument document) {
        DelimitedText table = DelimitedText.parse(text);
        return new DatumTable(DatumTable.guess(table), DatumTable.Defaults.of(document)).read(table, document);
    }

    @Test
    void readsRowsPastedFromASpreadsheet() {
        List<DatumTable.Outcome> rows = read(
                "3p - 3s\t16956.17(3)\n4p→3s\t30266.99\t0.02\n4s\t-15709.5\t0.5\teV\n",
                document(LabelConvention.ATOMIC, "x"));
        assertThat(rows).extracting(DatumTable.Outcome::problem).containsOnlyNulls();
        Datum line = rows.get(0).datum();
        assertThat(line.levels()).hasSize(2);
        assertThat(line.unit()).isEqualTo("cm^-1");
        assertThat(line.sigmaPlus().decimal()).isEqualByComparingTo("0.03");
        assertThat(rows.get(1).datum().sigmaPlus().text()).isEqualTo("0.02");
        assertThat(rows.get(2).datum().unit()).isEqualTo("eV");
        assertThat(rows).extracting(row -> row.datum().id()).containsExactly("d1", "d2", "d3");
    }

    @Test
    void followsHeadings() {
        List<DatumTable.Outcome> rows = read(
                "v',J',v'',J'',Isotopologue,wavenumber (cm^-1),unc,group,use\n1,2,0,1,b,2169.198,0.002,lamp,no\n",
                document(LabelConvention.VIBRATIONAL, "a", "b"));
        assertThat(rows).hasSize(1);
        Datum datum = rows.get(0).datum();
        assertThat(rows.get(0).problem()).isNull();
        assertThat(datum.levels().get(0).level().index()).isEqualTo(1);
        assertThat(datum.levels().get(0).level().channel().orbital()).isEqualTo(2);
        assertThat(datum.levels().get(1).coefficient()).isEqualTo(new ExactNumber("-1"));
        assertThat(datum.levels().get(1).level().system()).isEqualTo("b");
        assertThat(datum.groups()).containsExactly("lamp");
        assertThat(datum.used()).isFalse();
    }

    @Test
    void aFaultyRowCostsNoOtherAndNamesItsCell() {
        List<DatumTable.Outcome> rows = read(
                "levels;value;sigma\n3p - 3s;16956.17;0.03\n3j - 3s;1;1\n4p - 3s;abc;1\n5p - 3s;2;0\n",
                document(LabelConvention.ATOMIC, "x"));
        assertThat(rows.get(0).datum()).isNotNull();
        assertThat(rows).extracting(DatumTable.Outcome::column).containsExactly(-1, 0, 1, 2);
        assertThat(rows.get(1).problem().where()).contains("line 3");
        assertThat(rows.get(2).problem().sentence()).contains("line 4").contains("does not start with a number");
        assertThat(rows.get(3).problem().sentence()).contains("not positive");
    }

    @Test
    void putsTheSystemBeforeEachLevelOfALine() {
        List<DatumTable.Outcome> rows = read(
                "system\tlevels\tvalue\nb\tv=1 J=0 - v=0 J=0\t2143.27\n",
                document(LabelConvention.VIBRATIONAL, "a", "b"));
        assertThat(rows.get(0).problem()).isNull();
        assertThat(rows.get(0).datum().levels())
                .allMatch(c -> c.level().system().equals("b"));
    }

    @Test
    void quantitiesHaveNames() {
        for (Transform transform : Transform.values()) {
            assertThat(TransformText.parse(TransformText.title(transform))).isEqualTo(transform);
            assertThat(TransformText.parse(transform.name())).isEqualTo(transform);
        }
    }

    @Test
    void quotedCellsKeepTheirSeparators() {
        DelimitedText table = DelimitedText.parse("a,\"b,\"\"c\"\"\",d\r\n# a remark\r\n1,2,3\r\n");
        assertThat(table.rows()).hasSize(2);
        assertThat(table.rows().get(0).cells()).containsExactly("a", "b,\"c\"", "d");
        assertThat(table.rows().get(1).line()).isEqualTo(3);
    }

    @Test
    void findsTheSeparator() {
        assertThat(DelimitedText.parse("3p   1.25  0.02\n4p   1.5   0.02")
                        .rows()
                        .get(0)
                        .cells())
                .containsExactly("3p", "1.25", "0.02");
        assertThat(DelimitedText.parse("3p - 3s;1,25;0,02\n4p - 3s;1,5;0,02").separator())
                .isEqualTo(';');
        assertThat(DelimitedText.parse("").rows()).isEmpty();
    }
}
