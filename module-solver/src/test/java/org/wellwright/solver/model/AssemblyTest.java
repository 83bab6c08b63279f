package org.wellwright.solver.model;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;
import static org.wellwright.solver.fit.Documents.document;
import static org.wellwright.solver.fit.Documents.fixed;
import static org.wellwright.solver.fit.Documents.hydrogens;
import static org.wellwright.solver.fit.Documents.number;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.ExchangeSymmetry;
import org.wellwright.solver.pair.MassConvention;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.pair.ParticleCatalogue;
import org.wellwright.solver.potential.AngularFactor;
import org.wellwright.solver.potential.Argument;
import org.wellwright.solver.potential.ChannelFilter;
import org.wellwright.solver.potential.FamilyTerm;
import org.wellwright.solver.potential.FormulaTerm;
import org.wellwright.solver.potential.InnerContinuation;
import org.wellwright.solver.potential.OuterContinuation;
import org.wellwright.solver.potential.TableInterpolation;
import org.wellwright.solver.potential.TableKnot;
import org.wellwright.solver.potential.TableTerm;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermFrame;
import org.wellwright.solver.radial.RadialProblem;

/** Units, channels and spins on the way from a model to a radial problem. */
class AssemblyTest {
    private static Term formula(String name, String text) {
        return new FormulaTerm(TermFrame.named(name), text, Map.of());
    }

    private static Assembly assembly(String units, List<Parameter> pool, Curve curve) {
        return Assembly.of(
                document(units, hydrogens(), pool, List.of(Model.of("m", List.of(curve))), List.of(), List.of()), "m");
    }

    private static AssembledProblem spinless(Assembly assembly, int orbital) {
        return assembly.problem("H", "ground", ChannelKey.ofOrbital(orbital));
    }

    @Test
    void argumentsAreConvertedToTheUnitsOfTheProject() {
        Term coulomb = new FamilyTerm(
                TermFrame.named("c").withRange(Argument.ZERO, new Argument.Literal(20, "nm")),
                "coulomb",
                Map.of("strength", Argument.named("k")));
        List<Parameter> pool = List.of(fixed("k", "eV nm", "1.4399645468683608"));
        RadialProblem problem = spinless(assembly("atomic", pool, Curve.of("ground", List.of(coulomb))), 0)
                .problem();
        assertThat(problem.common().value(2)).isCloseTo(-0.5, within(1e-15));
        // 20 nm = 377.945... bohr with a0 = 0.0529177210544 nm (CODATA 2022)
        assertThat(problem.common().breakPoints().get(0).radius()).isCloseTo(20 / 0.0529177210544, within(1e-10));
        assertThat(problem.kinetic()).isCloseTo(0.5 * (1 + 1 / 1836.152673426), within(1e-15));
    }

    @Test
    void formulaTakesItsNumbersInTheUnitsOfTheProject() {
        List<Parameter> pool =
                List.of(fixed("k", "eV nm", "1.4399645468683608"), fixed("b", "1/nm", "18.897261259077824"));
        RadialProblem problem = spinless(
                        assembly("atomic", pool, Curve.of("ground", List.of(formula("f", "-k/r*exp(-b*r)")))), 0)
                .problem();
        assertThat(problem.common().value(1)).isCloseTo(-Math.exp(-1), within(1e-10));
    }

    @Test
    void chargesGiveTheCoulombStrength() {
        RadialProblem problem = spinless(
                        assembly("atomic", List.of(), Curve.of("ground", List.of(formula("f", "-coulomb/r")))), 0)
                .problem();
        assertThat(problem.common().value(1)).isEqualTo(-1);
    }

    @Test
    void whatIsTheSameEverywhereIsCommonAndSharedByAllChannels() {
        Parameter byOrbital = new Parameter(
                "d",
                "hartree",
                "",
                new ParameterShape.ByOrbital(
                        List.of(new ParameterShape.ByOrbital.Entry(0, Setting.fixed(number("0.1")))),
                        Setting.fixed(number("0.2"))));
        Term filtered =
                new FormulaTerm(TermFrame.named("p").withChannels(ChannelFilter.orbitals(1, 1)), "exp(-r)", Map.of());
        Curve curve = Curve.of("ground", List.of(formula("c", "-1/r"), formula("d", "d*exp(-r^2)"), filtered));
        Assembly assembly = assembly("atomic", List.of(byOrbital), curve);
        RadialProblem s = spinless(assembly, 0).problem();
        RadialProblem p = spinless(assembly, 1).problem();
        assertThat(s.common().canonical()).isEqualTo(p.common().canonical());
        assertThat(s.rest()).hasSize(1);
        assertThat(p.rest()).hasSize(2);
        assertThat(p.rest().get(0).potential().value(1)).isCloseTo(0.2 * Math.exp(-1), within(1e-16));
        assertThat(p.channels().get(0).centrifugal()).isEqualTo(2);
    }

    @Test
    void termThatIsOffIsIgnored() {
        Term off = formula("x", "5/r").withFrame(TermFrame.named("x").withEnabled(false));
        RadialProblem problem = spinless(
                        assembly("atomic", List.of(), Curve.of("ground", List.of(formula("c", "-1/r"), off))), 0)
                .problem();
        assertThat(problem.common().value(1)).isEqualTo(-1);
    }

    @Test
    void spinOrbitActsAsItsMatrixElement() {
        Term spinOrbit =
                formula("so", "exp(-r)").withFrame(TermFrame.named("so").withAngular(AngularFactor.SPIN_ORBIT));
        Curve curve =
                Curve.of("ground", List.of(formula("c", "-1/r"), spinOrbit)).withSpinScheme(SpinScheme.ONE_SPIN);
        Assembly assembly = assembly("atomic", List.of(), curve);
        // <L.S> = 1/2 for p3/2 and -1 for p1/2 (Bethe and Salpeter 1957)
        RadialProblem high =
                assembly.problem("H", "ground", ChannelKey.ofTotal(1, 3)).problem();
        RadialProblem low =
                assembly.problem("H", "ground", ChannelKey.ofTotal(1, 1)).problem();
        assertThat(high.rest().get(0).potential().value(1)).isCloseTo(0.5 * Math.exp(-1), within(1e-16));
        assertThat(low.rest().get(0).potential().value(1)).isCloseTo(-Math.exp(-1), within(1e-16));
        assertThat(assembly.problem("H", "ground", ChannelKey.ofTotal(0, 1))
                        .problem()
                        .rest())
                .isEmpty();
    }

    @Test
    void tensorForceMakesABlockOfTwoChannels() {
        Term tensor = formula("t", "exp(-r)").withFrame(TermFrame.named("t").withAngular(AngularFactor.TENSOR));
        Curve curve = Curve.of("ground", List.of(formula("c", "-1/r"), tensor)).withSpinScheme(SpinScheme.TWO_SPINS);
        Assembly assembly = assembly("atomic", List.of(), curve);
        RadialProblem block =
                assembly.problem("H", "ground", new ChannelKey(-1, 2, 2, 1)).problem();
        assertThat(block.channels()).extracting(channel -> channel.orbital()).containsExactly(0, 2);
        // S12 in the deuteron's channels: 0 in s, sqrt(8) between s and d, -2 in d (Blatt and Weisskopf 1952)
        assertThat(block.rest()).hasSize(2);
        assertThat(block.rest().get(0).row()).isZero();
        assertThat(block.rest().get(0).column()).isEqualTo(1);
        assertThat(block.rest().get(0).potential().value(1)).isCloseTo(Math.sqrt(8) * Math.exp(-1), within(1e-14));
        assertThat(block.rest().get(1).potential().value(1)).isCloseTo(-2 * Math.exp(-1), within(1e-14));
        assertThatThrownBy(() -> assembly.problem("H", "ground", ChannelKey.ofSpins(0, 2, 2)))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("the tensor term couples l = 0, S = 1, J = 1 with l = 2");
    }

    @Test
    void spinSpinTakesTheSpinsOfTheBodies() {
        Term contact = formula("ss", "exp(-r)").withFrame(TermFrame.named("ss").withAngular(AngularFactor.SPIN_SPIN));
        Curve curve = Curve.of("ground", List.of(formula("c", "-1/r"), contact)).withSpinScheme(SpinScheme.TWO_SPINS);
        Assembly assembly = assembly("atomic", List.of(), curve);
        // S1.S2 = 1/4 and -3/4 for two spins 1/2; 1/2 and -1 for spins 1/2 and 1
        assertThat(rest(assembly, "H", ChannelKey.ofSpins(0, 2, 2))).isCloseTo(0.25 * Math.exp(-1), within(1e-16));
        assertThat(rest(assembly, "H", ChannelKey.ofSpins(0, 0, 0))).isCloseTo(-0.75 * Math.exp(-1), within(1e-16));
        assertThat(rest(assembly, "D", ChannelKey.ofSpins(0, 3, 3))).isCloseTo(0.5 * Math.exp(-1), within(1e-16));
    }

    private static double rest(Assembly assembly, String system, ChannelKey channel) {
        return assembly.problem(system, "ground", channel)
                .problem()
                .rest()
                .get(0)
                .potential()
                .value(1);
    }

    @Test
    void planeHasItsOwnCentrifugalConstant() {
        Model flat = new Model(
                "flat",
                "",
                List.of(),
                List.of(Curve.of("ground", List.of(formula("c", "-1/r")))),
                List.of(),
                Geometry.PLANE,
                ModelError.NONE);
        Assembly assembly =
                Assembly.of(document("atomic", hydrogens(), List.of(), List.of(flat), List.of(), List.of()), "flat");
        assertThat(spinless(assembly, 0).problem().channels().get(0).centrifugal())
                .isEqualTo(-0.25);
        assertThat(spinless(assembly, 2).problem().channels().get(0).centrifugal())
                .isEqualTo(3.75);
    }

    @Test
    void equalModelsGiveEqualDigestsWhateverTheNotes() {
        Curve curve = Curve.of("ground", List.of(formula("c", "-1/r")));
        String one = spinless(assembly("atomic", List.of(), curve), 0).problem().digest();
        String renamed = spinless(
                        assembly(
                                "atomic",
                                List.of(fixed("unused", "eV", "3")),
                                Curve.of("ground", List.of(formula("other name", "-1/r")))),
                        0)
                .problem()
                .digest();
        assertThat(renamed).isEqualTo(one);
    }

    @Test
    void faultsNameModelCurveAndTerm() {
        Term bad = new FamilyTerm(
                TermFrame.named("core").withRange(Argument.of(3), Argument.of(2)),
                "coulomb",
                Map.of("strength", Argument.ONE));
        assertThatThrownBy(() -> spinless(assembly("atomic", List.of(), Curve.of("ground", List.of(bad))), 0))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageStartingWith("model 'm', curve 'ground', term 'core': a range needs 0 <= from < to");
    }

    @Test
    void numberMissingForAChannelAndChannelsThatDoNotFitAreRefused() {
        Parameter byOrbital = new Parameter(
                "d",
                "hartree bohr",
                "",
                new ParameterShape.ByOrbital(
                        List.of(new ParameterShape.ByOrbital.Entry(0, Setting.fixed(number("1")))), null));
        Assembly assembly = assembly("atomic", List.of(byOrbital), Curve.of("ground", List.of(formula("c", "-d/r"))));
        assertThatThrownBy(() -> spinless(assembly, 1))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("the parameter 'd' has no number for the system 'H', l = 1");
        assertThatThrownBy(() -> assembly.problem("H", "ground", ChannelKey.ofTotal(1, 1)))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("does not fit the spins of the curve");
        assertThatThrownBy(() -> assembly.problem("X", "ground", ChannelKey.ofOrbital(0)))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("the pair system 'X' is not known");
        Curve spins = Curve.of("ground", List.of(formula("c", "-1/r"))).withSpinScheme(SpinScheme.ONE_SPIN);
        assertThatThrownBy(() -> assembly("atomic", List.of(), spins).problem("H", "ground", ChannelKey.ofTotal(1, 5)))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("cannot be added to each other");
    }

    @Test
    void coupledCurvesAreRefusedByName() {
        Model coupled = new Model(
                "m",
                "",
                List.of(),
                List.of(
                        Curve.of("ground", List.of(formula("c", "-1/r"))),
                        Curve.of("excited", List.of(formula("c", "-2/r")))),
                List.of(new CurveCoupling("ground", "excited", List.of(formula("w", "exp(-r)")))),
                Geometry.SPACE,
                ModelError.NONE);
        Assembly assembly =
                Assembly.of(document("atomic", hydrogens(), List.of(), List.of(coupled), List.of(), List.of()), "m");
        assertThatThrownBy(() -> spinless(assembly, 0))
                .isInstanceOf(InvalidModelException.class)
                .hasMessageContaining("the curves 'ground' and 'excited' are coupled");
    }

    @Test
    void massesOfTheCatalogueFollowTheConvention() {
        Body electron = ParticleCatalogue.STANDARD.body("e-");
        Body core = new Body("Na+", new BodyMass.Catalogued("Na-23"), number("1"), -1);
        PairSystem sodium = new PairSystem(
                "Na", "", electron, core, MassConvention.ION, ExchangeSymmetry.DISTINGUISHABLE, number("1"), null);
        Assembly assembly = Assembly.of(
                document(
                        "spectroscopic",
                        List.of(sodium),
                        List.of(),
                        List.of(Model.of("m", List.of(Curve.of("ground", List.of(formula("c", "-coulomb/r")))))),
                        List.of(),
                        List.of()),
                "m");
        RadialProblem problem =
                assembly.problem("Na", "ground", ChannelKey.ofOrbital(0)).problem();
        double strength = -problem.common().value(1);
        // Rydberg constant of sodium with the ion's mass, 109734.697139 cm^-1, recomputed from AME masses.
        assertThat(strength * strength / (4 * problem.kinetic())).isCloseTo(109734.697139, within(2e-5));
    }

    @Test
    void tableIsReadInItsOwnUnits() {
        List<TableKnot> knots = new ArrayList<>();
        for (int i = 1; i <= 40; i++) {
            double r = 0.1 * i;
            knots.add(new TableKnot(r, Argument.of(-14.399645468683608 / r)));
        }
        Term table = new TableTerm(
                TermFrame.named("t"),
                "angstrom",
                "eV",
                knots,
                TableInterpolation.STANDARD,
                InnerContinuation.power(1),
                OuterContinuation.power(Argument.ZERO, Argument.of(-14.399645468683608), 1));
        RadialProblem problem = spinless(assembly("atomic", List.of(), Curve.of("ground", List.of(table))), 0)
                .problem();
        // -e^2/(4 pi eps0 r) is -1/r in atomic units: exactly at the knots and in the tail.
        double bohr = 1 / 0.529177210544;
        assertThat(problem.common().value(2.5 * bohr)).isCloseTo(-1 / (2.5 * bohr), within(1e-12));
        assertThat(problem.common().value(50)).isCloseTo(-0.02, within(1e-14));
    }
}
