package org.wellwright.viewer.spectrum;

import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.FigureInput;
import org.wellwright.project.FigureSelection;
import org.wellwright.project.SolvedModel;
import org.wellwright.project.SpectralLine;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.LevelText;

/**
 * What the picture of a spectrum shows: a lane of measured lines, then one lane per model.
 *
 * @param subtitle the project
 * @param energy the axis of transition energies
 * @param lanes the lanes, top first
 * @param strengths whether heights show oscillator strengths
 */
record LineSpectrum(String subtitle, AxisSpec energy, List<Lane> lanes, boolean strengths) {
    /** Lines weaker than this share of the strongest do not widen the axis. */
    private static final double WEAK = 0.01;

    /**
     * One lane.
     *
     * @param name the model, or "measured"
     * @param series index of its colour; −1 for measured lines
     * @param lines its lines
     */
    record Lane(String name, int series, List<Line> lines) {
        Lane {
            lines = List.copyOf(lines);
        }

        /** Whether it holds what was measured. */
        boolean measured() {
            return series < 0;
        }
    }

    /**
     * One line.
     *
     * @param label upper and lower level
     * @param upper the upper level
     * @param energy transition energy
     * @param sigma its uncertainty; NaN if none
     * @param height 0 to 1: square root of the strength over the largest
     * @param selected whether one of its levels is selected
     */
    record Line(String label, LevelKey upper, double energy, double sigma, double height, boolean selected) {}

    LineSpectrum {
        lanes = List.copyOf(lanes);
    }

    static LineSpectrum of(FigureInput input, FigureSelection selection) {
        double strongest = input.lines().stream()
                .mapToDouble(SpectralLine::strength)
                .filter(Double::isFinite)
                .max()
                .orElse(0);
        LevelText names = LevelText.of(input.document());
        List<Lane> lanes = new ArrayList<>();
        List<Line> measured = lines(input, "", strongest, names, selection);
        if (!measured.isEmpty()) {
            lanes.add(new Lane("measured", -1, measured));
        }
        for (int i = 0; i < input.models().size(); i++) {
            SolvedModel model = input.models().get(i);
            List<Line> lines = lines(input, model.model(), strongest, names, selection);
            if (!lines.isEmpty()) {
                lanes.add(new Lane(model.model(), i, lines));
            }
        }
        String label = "Transition energy (%s)".formatted(input.units().energy().printed());
        return new LineSpectrum(input.title(), range(label, input.lines(), strongest), lanes, strongest > 0);
    }

    private static List<Line> lines(
            FigureInput input, String model, double strongest, LevelText names, FigureSelection selection) {
        List<Line> lines = new ArrayList<>();
        for (SpectralLine line : input.lines()) {
            if (line.model().equals(model)) {
                double share =
                        Double.isFinite(line.strength()) && strongest > 0 ? Math.abs(line.strength()) / strongest : 1;
                boolean selected = selection.levels().contains(line.upper())
                        || selection.levels().contains(line.lower());
                String label = names.level(line.upper()) + " → " + names.level(line.lower());
                lines.add(new Line(
                        label, line.upper(), line.energy(), line.sigma(), Math.sqrt(Math.min(1, share)), selected));
            }
        }
        return lines;
    }

    private static AxisSpec range(String label, List<SpectralLine> lines, double strongest) {
        double lowest = Double.POSITIVE_INFINITY;
        double highest = Double.NEGATIVE_INFINITY;
        for (SpectralLine line : lines) {
            if (line.model().isEmpty() || !(line.strength() < WEAK * strongest)) {
                lowest = Math.min(lowest, line.energy());
                highest = Math.max(highest, line.energy());
            }
        }
        if (!(lowest <= highest)) {
            return AxisSpec.of(label, 0, 1);
        }
        double margin = highest > lowest ? 0.08 * (highest - lowest) : Math.max(1e-9, 0.1 * Math.abs(highest));
        return AxisSpec.of(label, lowest - margin, highest + margin);
    }
}
