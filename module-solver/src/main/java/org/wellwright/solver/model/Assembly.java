package org.wellwright.solver.model;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.angular.SpinOperators;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.potential.AngularFactor;
import org.wellwright.solver.potential.ChannelFacts;
import org.wellwright.solver.potential.ChannelFilter;
import org.wellwright.solver.potential.HardWalls;
import org.wellwright.solver.potential.PotentialSum;
import org.wellwright.solver.potential.Term;
import org.wellwright.solver.potential.TermEvaluator;
import org.wellwright.solver.radial.ChannelTerm;
import org.wellwright.solver.radial.RadialChannel;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.units.Dimension;
import org.wellwright.solver.units.Names;

/**
 * Turns a model of a document into radial problems: the only place where units are converted.
 *
 * <p>Terms that are the same in every channel go into the common potential, so that a solver evaluates them once; the
 * others (numbers by l, channel filters, spin operators) follow as channel terms. Thread-safe for reading.
 */
public final class Assembly {
    private final Model model;
    private final ParameterPool pool;
    private final TermBinder binder;

    private Assembly(Model model, ParameterPool pool) {
        this.model = model;
        this.pool = pool;
        this.binder = new TermBinder(pool);
    }

    /**
     * The assembly of one model.
     *
     * @throws InvalidModelException if there is no such model, or a unit or tie of the pool cannot be read
     */
    public static Assembly of(ModelDocument document, String modelName) {
        return of(document, modelName, ParameterPool.of(document));
    }

    /** The assembly of one model with the document's pool, made once for several models. */
    public static Assembly of(ModelDocument document, String modelName, ParameterPool pool) {
        for (Model model : document.models()) {
            if (model.name().equals(modelName)) {
                return new Assembly(model, pool);
            }
        }
        throw new InvalidModelException(
                "the model '%s' is not known".formatted(Names.shortened(modelName)),
                "",
                Names.remedy(
                        modelName, document.models().stream().map(Model::name).toList()));
    }

    /** The model. */
    public Model model() {
        return model;
    }

    /** The pool that its numbers come from. */
    public ParameterPool pool() {
        return pool;
    }

    /** The problem of a channel at the values as typed. */
    public AssembledProblem problem(String system, String curve, ChannelKey channel) {
        return problem(system, curve, channel, pool.typedValues());
    }

    /**
     * The problem of a channel.
     *
     * @param values one per number of the pool, in the parameters' units
     * @throws InvalidModelException if the model has no such curve, does not serve the system, or a term cannot be
     *     used; says where
     */
    public synchronized AssembledProblem problem(String system, String curve, ChannelKey channel, double[] values) {
        Curve shape = requireCurve(system, curve);
        String where = "model '%s', curve '%s'".formatted(model.name(), curve);
        try {
            return assemble(system, shape, channel, values, where);
        } catch (InvalidModelException fault) {
            throw fault.problem().where().startsWith("model ") ? fault : TermBinder.located(fault, where);
        }
    }

    private Curve requireCurve(String system, String name) {
        Curve curve = model.curve(name);
        String where = "model '%s'".formatted(model.name());
        if (curve == null) {
            throw new InvalidModelException(
                    "there is no curve '%s'".formatted(Names.shortened(name)),
                    where,
                    Names.remedy(name, model.curves().stream().map(Curve::name).toList()));
        }
        if (!model.serves(system)) {
            throw new InvalidModelException(
                    "the model does not serve the system '%s'".formatted(Names.shortened(system)),
                    where,
                    "add the system to the model");
        }
        for (CurveCoupling coupling : model.couplings()) {
            if (coupling.first().equals(name) || coupling.second().equals(name)) {
                throw new InvalidModelException(
                        "the curves '%s' and '%s' are coupled, which cannot be solved yet"
                                .formatted(coupling.first(), coupling.second()),
                        where,
                        "remove the coupling");
            }
        }
        return curve;
    }

    private AssembledProblem assemble(String system, Curve curve, ChannelKey channel, double[] values, String where) {
        List<ChannelKey> channels = channels(curve, channel);
        Place place = new Place(system, channel);
        Walls walls = new Walls(
                binder.argument(curve.innerWall(), place, Dimension.LENGTH, values),
                binder.argument(curve.outerWall(), place, Dimension.LENGTH, values));
        List<TermEvaluator> commonTerms = new ArrayList<>();
        List<PoolValue> commonValues = new ArrayList<>();
        List<ChannelTerm> rest = new ArrayList<>();
        List<List<PoolValue>> restValues = new ArrayList<>();
        for (Term term : curve.terms()) {
            if (!term.frame().enabled()) {
                continue;
            }
            try {
                refuseHiddenCoupling(term, channel);
                for (int row = 0; row < channels.size(); row++) {
                    for (int column = row; column < channels.size(); column++) {
                        double angular = angular(term, system, curve, channels.get(row), channels.get(column));
                        if (angular == 0) {
                            continue;
                        }
                        ChannelFacts facts = channels.get(row).facts();
                        BoundTerm bound =
                                binder.bind(term, new Place(system, channels.get(row)), facts, angular, values);
                        walls.tighten(bound);
                        boolean everywhere = term.frame().angular() == AngularFactor.UNITY
                                && term.frame().channels().equals(ChannelFilter.ALL)
                                && !bound.channelDependent();
                        if (everywhere && row == 0) {
                            commonTerms.add(bound.evaluator());
                            commonValues.addAll(bound.parameters());
                        } else if (!everywhere) {
                            rest.add(new ChannelTerm(row, column, bound.evaluator()));
                            restValues.add(bound.parameters());
                        }
                    }
                }
            } catch (WellwrightException fault) {
                throw TermBinder.located(
                        fault, "%s, term '%s'".formatted(where, term.frame().name()));
            }
        }
        PoolValue kinetic = pool.kinetic(system, values);
        List<RadialChannel> radial = channels.stream()
                .map(key -> new RadialChannel(key.orbital(), model.geometry().centrifugal(key.orbital()), 0))
                .toList();
        walls.check();
        RadialProblem problem = new RadialProblem(
                kinetic.value(), radial, PotentialSum.of(commonTerms), rest, walls.inner.value(), walls.outer.value());
        PoolValue origin = binder.argument(curve.energyOrigin(), place, Dimension.ENERGY, values);
        return new AssembledProblem(
                new LevelKey(system, curve.name(), channel, 0),
                problem,
                origin,
                kinetic,
                commonValues,
                restValues,
                walls.inner,
                walls.outer);
    }

    /** The uncoupled channels that a key stands for. */
    private static List<ChannelKey> channels(Curve curve, ChannelKey channel) {
        boolean spins = channel.twiceSpin() >= 0 || channel.twiceTotal() >= 0;
        if (curve.spinScheme() == SpinScheme.NONE == spins) {
            throw new InvalidModelException(
                    "the channel %s does not fit the spins of the curve".formatted(channel.describe()),
                    "",
                    spins ? "leave j and S out" : "give j, or S and J");
        }
        if (!channel.coupled()) {
            if (spins) {
                requireTriangle(channel);
            }
            return List.of(channel);
        }
        List<ChannelKey> channels = new ArrayList<>();
        int twiceSpin = channel.twiceSpin();
        int twiceTotal = channel.twiceTotal();
        if (twiceSpin < 0 || (twiceSpin + twiceTotal) % 2 != 0) {
            throw new InvalidModelException(
                    "the block %s needs an S that makes l an integer".formatted(channel.describe()), "", "give S");
        }
        for (int twiceL = Math.abs(twiceTotal - twiceSpin); twiceL <= twiceTotal + twiceSpin; twiceL += 2) {
            if ((twiceL / 2 % 2 == 0) == (channel.parity() > 0)) {
                channels.add(ChannelKey.ofSpins(twiceL / 2, twiceSpin, twiceTotal));
            }
        }
        if (channels.isEmpty()) {
            throw new InvalidModelException(
                    "the block %s contains no channel".formatted(channel.describe()), "", "change its parity");
        }
        return channels;
    }

    private static void requireTriangle(ChannelKey channel) {
        int twiceL = 2 * channel.orbital();
        int twiceSpin = channel.twiceSpin();
        int twiceTotal = channel.twiceTotal();
        boolean fits = twiceSpin >= 0
                && twiceTotal >= Math.abs(twiceL - twiceSpin)
                && twiceTotal <= twiceL + twiceSpin
                && (twiceL + twiceSpin + twiceTotal) % 2 == 0;
        if (!fits) {
            throw new InvalidModelException(
                    "l, spin and total of the channel %s cannot be added to each other".formatted(channel.describe()),
                    "",
                    "j or J lies between |l - S| and l + S in steps of 1");
        }
    }

    /** Matrix element of a term's angular operator, 0 where the term does not act. */
    private double angular(Term term, String system, Curve curve, ChannelKey row, ChannelKey column) {
        AngularFactor factor = term.frame().angular();
        boolean diagonal = row.equals(column);
        if (!term.frame().channels().accepts(row.facts())
                || !term.frame().channels().accepts(column.facts())) {
            return 0;
        }
        if (factor == AngularFactor.UNITY) {
            return diagonal ? 1 : 0;
        }
        if (curve.spinScheme() == SpinScheme.NONE) {
            throw new InvalidModelException(
                    "the term acts on spins, but the curve has none", "", "give the curve a spin scheme");
        }
        if (factor == AngularFactor.SPIN_ORBIT) {
            return diagonal ? SpinOperators.spinOrbit(row.orbital(), row.twiceSpin(), row.twiceTotal()) : 0;
        }
        if (curve.spinScheme() != SpinScheme.TWO_SPINS) {
            throw new InvalidModelException(
                    "the term acts on two spins, but the curve has one", "", "give the curve two spins");
        }
        if (factor == AngularFactor.SPIN_SPIN) {
            PairSystem pair = pool.system(system);
            int one = pair.first().twiceSpin();
            int other = pair.second().twiceSpin();
            if (one < 0 || other < 0) {
                throw new InvalidModelException(
                        "the term acts on the spins of the bodies, which the system '%s' does not give"
                                .formatted(system),
                        "",
                        "give both spins");
            }
            return diagonal ? SpinOperators.spinSpin(one, other, row.twiceSpin()) : 0;
        }
        return tensor(row, column);
    }

    /**
     * A tensor term couples the channel asked for with one of another l: alone, it would not be the system's channel.
     */
    private static void refuseHiddenCoupling(Term term, ChannelKey channel) {
        if (term.frame().angular() != AngularFactor.TENSOR || channel.coupled() || channel.twiceSpin() < 2) {
            return;
        }
        for (int other : new int[] {channel.orbital() - 2, channel.orbital() + 2}) {
            boolean exists = other >= 0
                    && 2 * other >= Math.abs(channel.twiceTotal() - channel.twiceSpin())
                    && 2 * other <= channel.twiceTotal() + channel.twiceSpin();
            if (exists
                    && term.frame()
                            .channels()
                            .accepts(new ChannelFacts(other, channel.twiceTotal(), channel.twiceSpin()))) {
                throw new InvalidModelException(
                        "the tensor term couples %s with l = %d".formatted(channel.describe(), other),
                        "",
                        "name the block by J and parity instead of l");
            }
        }
    }

    private static double tensor(ChannelKey row, ChannelKey column) {
        int twiceSpin = row.twiceSpin();
        if (twiceSpin < 2) {
            return 0;
        }
        return SpinOperators.tensor(row.orbital(), column.orbital(), twiceSpin, row.twiceTotal());
    }

    /** The tightest walls of a curve and its terms. */
    private static final class Walls {
        private PoolValue inner;
        private PoolValue outer;

        Walls(PoolValue inner, PoolValue outer) {
            this.inner = inner;
            this.outer = outer;
        }

        void tighten(BoundTerm term) {
            HardWalls own = term.evaluator().walls();
            if (own.inner() > inner.value()) {
                inner = chained(own.inner(), own.innerGradient(), term.parameters());
            }
            if (own.outer() < outer.value()) {
                outer = chained(own.outer(), own.outerGradient(), term.parameters());
            }
        }

        void check() {
            if (!(inner.value() >= 0 && outer.value() > inner.value())) {
                throw new InvalidModelException(
                        "the walls need 0 <= inner < outer, got %s, %s".formatted(inner.value(), outer.value()),
                        "",
                        "change the walls");
            }
        }

        private static PoolValue chained(double radius, List<Double> gradient, List<PoolValue> parameters) {
            if (gradient.isEmpty()) {
                return PoolValue.constant(radius);
            }
            double[] partials =
                    gradient.stream().mapToDouble(Double::doubleValue).toArray();
            return PoolValue.chained(radius, parameters.toArray(new PoolValue[0]), partials);
        }
    }
}
