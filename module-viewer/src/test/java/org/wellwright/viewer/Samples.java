package org.wellwright.viewer;

import java.awt.Font;
import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureRequest;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.MeasuredLevel;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.project.SpectralLine;
import org.wellwright.solver.fit.Comparison;
import org.wellwright.solver.fit.FitQuality;
import org.wellwright.solver.fit.ModelComparison;
import org.wellwright.solver.fit.ResidualRow;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.Datum.Contribution;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Transform;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.pair.Body;
import org.wellwright.solver.pair.BodyMass;
import org.wellwright.solver.pair.PairSystem;
import org.wellwright.solver.radial.Completeness;
import org.wellwright.solver.radial.Level;
import org.wellwright.solver.radial.LevelOutcome;
import org.wellwright.solver.radial.LevelSearch;
import org.wellwright.solver.radial.RadialProblem;
import org.wellwright.solver.radial.RadialState;
import org.wellwright.solver.radial.Spectrum;
import org.wellwright.solver.units.ExactNumber;

/** Invented projects for pictures: hydrogen-like levels with an invented quantum defect, so that models differ. */
public final class Samples {
    /** The system of all samples. */
    public static final String SYSTEM = "pair";

    /** The curve of all samples. */
    public static final String CURVE = "V";

    private Samples() {}

    /** Three models with levels to n in l = 0…largest, the lower ones measured. */
    public static FigureInput atom(int n, int largest) {
        return atom("Invented ion", List.of("screened core", "polarised core", "point charge"), n, largest);
    }

    /** The same with given names. */
    public static FigureInput atom(String title, List<String> names, int n, int largest) {
        List<SolvedModel> models = new ArrayList<>();
        for (int i = 0; i < names.size(); i++) {
            models.add(model(names.get(i), 0.17 * (2 - i), n, largest));
        }
        List<MeasuredLevel> measured = new ArrayList<>();
        List<Datum> data = new ArrayList<>();
        for (SolvedChannel channel : models.get(0).channels()) {
            for (Level level : channel.spectrum().levels()) {
                if (level.index() < 4) {
                    LevelKey key = channel.key(level.index());
                    double energy = level.energy()
                            * (1 + 0.004 * ((level.index() + channel.channel().orbital()) % 3 - 1));
                    measured.add(new MeasuredLevel(key, energy, 0.002, 0.003, "d" + data.size(), ""));
                    data.add(Datum.of(
                            "d" + data.size(),
                            List.of(new Contribution(ExactNumber.ONE, key)),
                            Transform.NONE,
                            ExactNumber.of(energy),
                            "hartree",
                            new ExactNumber("0.0025")));
                }
            }
        }
        PairSystem pair = PairSystem.of(SYSTEM, body("e-", "-1"), body("core", "1"));
        ModelDocument document = new ModelDocument(
                "CODATA 2022",
                "CODATA 2022, AME 2020",
                "atomic",
                LabelConvention.ATOMIC,
                Weighting.KNOWN,
                List.of(pair),
                List.of(),
                List.of(),
                data,
                List.of());
        return new FigureInput(title, "0".repeat(64), document, models, measured, compare(models, data), lines(models));
    }

    /** A request of a picture without a display. */
    public static FigureRequest request(
            FigureInput input, FigureSelection selection, String variant, boolean dark, float size) {
        return new FigureRequest(
                input,
                selection,
                variant,
                dark ? FigureRequest.Ground.DARK : FigureRequest.Ground.LIGHT,
                new Font(Font.SANS_SERIF, Font.PLAIN, 1).deriveFont(size));
    }

    private static Body body(String name, String charge) {
        return new Body(name, new BodyMass.Catalogued("e-"), new ExactNumber(charge), -1);
    }

    private static SolvedModel model(String name, double defect, int n, int largest) {
        List<SolvedChannel> channels = new ArrayList<>();
        for (int l = 0; l <= largest; l++) {
            channels.add(channel(l, defect / (1 + 3 * l * l), n));
        }
        return new SolvedModel(name, channels, List.of());
    }

    private static SolvedChannel channel(int l, double defect, int n) {
        RadialProblem problem = RadialProblem.single(0.5, l, new CoulombTerm(1));
        List<LevelOutcome> levels = new ArrayList<>();
        List<RadialState> states = new ArrayList<>();
        for (int principal = l + 1; principal <= n; principal++) {
            double effective = principal - defect;
            double energy = -0.5 / (effective * effective);
            Level level = new Level(
                    principal - l - 1,
                    energy,
                    energy - 1e-13,
                    energy + 1e-13,
                    Level.BoundKind.TWO_SIDED,
                    1e-14,
                    -2 * energy,
                    Double.NaN,
                    0);
            levels.add(level);
            states.add(new CoulombState(problem, level, 1, principal, l));
        }
        Spectrum spectrum = new Spectrum(
                problem,
                LevelSearch.first(Math.max(1, n - l)),
                levels,
                states,
                Completeness.PROVED,
                0,
                "",
                new Spectrum.Effort(30, 4000, 50));
        return new SolvedChannel(SYSTEM, CURVE, ChannelKey.ofOrbital(l), 0, spectrum);
    }

    private static Comparison compare(List<SolvedModel> models, List<Datum> data) {
        List<ModelComparison> compared = new ArrayList<>();
        for (SolvedModel model : models) {
            List<ResidualRow> rows = new ArrayList<>();
            double sum = 0;
            for (Datum datum : data) {
                LevelKey key = datum.levels().get(0).level();
                double energy = model.channelOf(key).level(key.index()).energy();
                double residual = (datum.value().value() - energy) / 0.0025;
                sum += residual * residual;
                rows.add(new ResidualRow(
                        datum.id(),
                        datum.value().value(),
                        energy,
                        Double.NaN,
                        0,
                        0.0025,
                        residual,
                        "hartree",
                        true,
                        null));
            }
            compared.add(new ModelComparison(
                    model.model(),
                    compared.size() + 1,
                    new FitQuality(sum, data.size(), 2, Double.NaN),
                    sum + 4,
                    rows,
                    "d0",
                    List.of(),
                    List.of()));
        }
        return new Comparison(Weighting.KNOWN, compared, data.size());
    }

    private static List<SpectralLine> lines(List<SolvedModel> models) {
        List<SpectralLine> lines = new ArrayList<>();
        for (SolvedModel model : models) {
            for (SolvedChannel lower : model.channels()) {
                for (SolvedChannel upper : model.channels()) {
                    int l = lower.channel().orbital();
                    if (Math.abs(l - upper.channel().orbital()) != 1
                            || lower.spectrum().levels().isEmpty()) {
                        continue;
                    }
                    Level low = lower.spectrum().levels().get(0);
                    for (Level high : upper.spectrum().levels()) {
                        double energy = high.energy() - low.energy();
                        if (energy > 0 && high.index() < 6) {
                            double dipole = upper.spectrum()
                                    .state(high.index())
                                    .overlap(0, lower.spectrum().state(0), 0, r -> r);
                            double strength = 2
                                    * energy
                                    / 3
                                    * Math.max(l, upper.channel().orbital())
                                    / (2 * l + 1)
                                    * dipole
                                    * dipole;
                            lines.add(new SpectralLine(
                                    model.model(),
                                    upper.key(high.index()),
                                    lower.key(0),
                                    energy,
                                    Double.NaN,
                                    strength));
                        }
                    }
                }
            }
        }
        for (SpectralLine line : List.copyOf(lines)) {
            if (line.model().equals(models.get(0).model()) && line.strength() > 0.02) {
                lines.add(new SpectralLine("", line.upper(), line.lower(), line.energy() * 1.004, 0.002, Double.NaN));
            }
        }
        return lines;
    }
}
