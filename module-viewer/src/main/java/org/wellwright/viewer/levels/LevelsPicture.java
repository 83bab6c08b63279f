package org.wellwright.viewer.levels;

import java.awt.Graphics2D;
import org.wellwright.viewer.levels.LevelDiagram.Bar;
import org.wellwright.viewer.levels.LevelDiagramLayout.PlacedBar;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Viewport;

/**
 * The level diagram as a picture.
 *
 * @param diagram what it shows
 * @param unit unit of energies
 */
record LevelsPicture(LevelDiagram diagram, String unit) implements Picture {
    @Override
    public boolean movesAcross() {
        return false;
    }

    @Override
    public boolean movesUp() {
        return true;
    }

    @Override
    public Painted paint(Graphics2D g, int width, int height, PlotStyle style, Viewport view) {
        LevelDiagramPainter.Painted painted = LevelDiagramPainter.paint(g, width, height, diagram, style, view);
        return new Pointed(painted, unit, style.em() * 0.6);
    }

    private record Pointed(LevelDiagramPainter.Painted painted, String unit, double reach) implements Painted {
        @Override
        public PlotFrame.Area area() {
            return painted.area();
        }

        @Override
        public Spot at(double x, double y) {
            PlacedBar placed = painted.layout().at(x, y, reach);
            return placed == null
                    ? null
                    : new Spot(
                            text(placed.bar()),
                            placed.bar().model(),
                            placed.bar().key());
        }

        private String text(Bar bar) {
            String head = "%s, %s".formatted(bar.label(), bar.model().isEmpty() ? "measured" : bar.model());
            String energy = "E = %s %s".formatted(bar.energy(), unit);
            if (bar.model().isEmpty()) {
                String sigma = bar.below() == bar.above()
                        ? "± " + bar.above()
                        : "+ %s − %s".formatted(bar.above(), bar.below());
                return head + "\n" + energy + (bar.above() > 0 ? "\nσ: %s %s".formatted(sigma, unit) : "");
            }
            return head + "\n" + energy
                    + "\nat least %s\nat most %s".formatted(bar.energy() - bar.below(), bar.energy() + bar.above());
        }
    }
}
