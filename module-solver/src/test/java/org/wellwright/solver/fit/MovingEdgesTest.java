package org.wellwright.solver.fit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.wellwright.solver.fit.Documents.document;
import static org.wellwright.solver.fit.Documents.energy;
import static org.wellwright.solver.fit.Documents.fixed;
import static org.wellwright.solver.fit.Documents.hydrogens;
import static org.wellwright.solver.fit.Documents.level;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.model.Curve;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableInterpolation;
import org.wellwright.solver.potential.TableKnot;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.units.ExactNumber;

/** Derivatives by smooth parameters, masses, range ends, well radii and walls, through the registered solver. */
class MovingEdgesTest {
    private static final RegisteredSolver SOLVER = new RegisteredSolver();

    private static Term formula(String name, String text) {
        return new FormulaTerm(TermFrame.named(name), text, Map.of());
    }

    private static ModelDocument of(List<Parameter> pool, Curve curve) {
        return document("atomic", hydrogens(), pool, List.of(Model.of("m", List.of(curve))), List.of(), List.of());
    }

    private static int compare(ModelDocument document) {
        return PoolGradients.assertAgreeWithDifferences(
                document, List.of(level("H", 0, 0), level("H", 0, 2), level("H", 1, 1)), SOLVER, 3e-3, 1e-5);
    }

    @Test
    void smoothFormulaAndReducedMass() {
        Body light = new Body("", new BodyMass.FromParameter("light"), ExactNumber.ONE, -1);
        Body heavy = new Body("", new BodyMass.FromParameter("heavy"), ExactNumber.ONE, -1);
        List<Parameter> pool = List.of(
                fixed("depth", "hartree", "6"),
                fixed("width", "bohr", "3"),
                fixed("light", "m_e", "1.5"),
                fixed("heavy", "m_e", "4"));
        Curve curve = Curve.of("ground", List.of(formula("f", "-depth*exp(-(r/width)^2)")));
        ModelDocument document = document(
                "atomic",
                List.of(PairSystem.of("H", light, heavy)),
                pool,
                List.of(Model.of("m", List.of(curve))),
                List.of(),
                List.of());
        assertThat(compare(document)).isEqualTo(12);
    }

    @Test
    void endsOfARange() {
        List<Parameter> pool =
                List.of(fixed("k", "hartree/bohr^2", "0.5"), fixed("a", "bohr", "0.7"), fixed("b", "bohr", "2.9"));
        Term well = formula("well", "0.1*r - 6")
                .withFrame(TermFrame.named("well").withRange(Argument.named("a"), Argument.named("b")));
        Curve curve = Curve.of("ground", List.of(formula("harmonic", "k*r^2/2"), well));
        assertThat(compare(of(pool, curve))).isEqualTo(9);
    }

    @Test
    void radiusOfASquareWell() {
        List<Parameter> pool = List.of(fixed("V", "hartree", "10"), fixed("R", "bohr", "2.5"));
        Term well = new FamilyTerm(
                TermFrame.named("well"),
                "square-well",
                Map.of("depth", Argument.named("V"), "radius", Argument.named("R")));
        assertThat(compare(of(pool, Curve.of("ground", List.of(well))))).isEqualTo(6);
    }

    @Test
    void hardWalls() {
        List<Parameter> pool =
                List.of(fixed("k", "hartree bohr", "1"), fixed("inner", "bohr", "0.4"), fixed("outer", "bohr", "6"));
        Curve curve = Curve.of("ground", List.of(formula("c", "-k/r")))
                .withInnerWall(Argument.named("inner"))
                .withOuterWall(Argument.named("outer"));
        assertThat(compare(of(pool, curve))).isEqualTo(9);
    }

    @Test
    void tableWithItsValuesAndTailInThePool() {
        List<Parameter> pool = List.of(
                fixed("v2", "eV", "-60"),
                fixed("C", "eV angstrom^2", "-30"),
                fixed("n", "", "2"),
                fixed("c", "1/angstrom", "2.2"));
        List<TableKnot> knots = List.of(
                new TableKnot(0.3, Argument.of(90)),
                new TableKnot(0.6, Argument.of(-30)),
                new TableKnot(1.0, Argument.named("v2")),
                new TableKnot(1.6, Argument.of(-40)),
                new TableKnot(2.4, Argument.of(-15)),
                new TableKnot(3.6, Argument.of(-4)));
        TableTerm table = new TableTerm(
                TermFrame.named("table"),
                "angstrom",
                "eV",
                knots,
                TableInterpolation.STANDARD,
                new InnerContinuation(InnerContinuation.Kind.EXPONENTIAL, Argument.named("c")),
                OuterContinuation.power(Argument.ZERO, Argument.named("C"), 2));
        assertThat(compare(of(pool.subList(0, 2), Curve.of("ground", List.of(steep(table, Argument.of(2.2)))))))
                .isEqualTo(6);
        TableTerm moving = new TableTerm(
                TermFrame.named("table"),
                "angstrom",
                "eV",
                knots,
                TableInterpolation.STANDARD,
                table.inner(),
                new OuterContinuation(
                        OuterContinuation.Kind.JOINED_POWER, Argument.ZERO, Argument.of(-30), Argument.named("n")));
        List<Parameter> others = List.of(pool.get(0), pool.get(2), pool.get(3));
        assertThat(compare(of(others, Curve.of("ground", List.of(moving))))).isEqualTo(9);
    }

    private static TableTerm steep(TableTerm table, Argument steepness) {
        return new TableTerm(
                table.frame(),
                table.radiusUnit(),
                table.valueUnit(),
                table.knots(),
                table.interpolation(),
                new InnerContinuation(InnerContinuation.Kind.EXPONENTIAL, steepness),
                table.outer());
    }

    @Test
    void radiiFollowTheirParametersToo() {
        List<Parameter> pool = List.of(
                fixed("k", "hartree bohr", "1.3"),
                fixed("b", "bohr", "2.2"),
                fixed("s", "hartree", "0.4"),
                fixed("inner", "bohr", "0.1"),
                fixed("outer", "bohr", "7"));
        Term step =
                formula("step", "s*r").withFrame(TermFrame.named("step").withRange(Argument.ZERO, Argument.named("b")));
        Curve curve = Curve.of("ground", List.of(formula("c", "-k/r"), step))
                .withInnerWall(Argument.named("inner"))
                .withOuterWall(Argument.named("outer"));
        ModelDocument document = of(pool, curve);
        for (int power : new int[] {-1, 1, 2}) {
            Datum radius = energy("r", level("H", 1, 1), 1, "bohr", 1)
                    .withTransform(Transform.RADIUS, new Datum.Detail(power, 1), "bohr");
            assertThat(PoolGradients.assertDatumAgreesWithDifferences(document, radius, SOLVER, 3e-3, 1e-5))
                    .isEqualTo(5);
        }
    }

    @Test
    void radiusFollowsTheReducedMass() {
        Body light = new Body("", new BodyMass.FromParameter("light"), ExactNumber.ONE, -1);
        Body heavy = new Body("", new BodyMass.FromParameter("heavy"), ExactNumber.ONE, -1);
        List<Parameter> pool = List.of(fixed("light", "m_e", "1.5"), fixed("heavy", "m_e", "4"));
        ModelDocument document = document(
                "atomic",
                List.of(PairSystem.of("H", light, heavy)),
                pool,
                List.of(Model.of("m", List.of(Curve.of("ground", List.of(formula("f", "-1/r")))))),
                List.of(),
                List.of());
        Datum radius = energy("r", level("H", 0, 1), 1, "bohr", 1)
                .withTransform(Transform.RADIUS, Datum.Detail.STANDARD, "bohr");
        assertThat(PoolGradients.assertDatumAgreesWithDifferences(document, radius, SOLVER, 3e-3, 1e-5))
                .isEqualTo(2);
    }
}
