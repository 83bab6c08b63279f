package org.wellwright.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.event.KeyEvent;
import java.awt.event.MouseEvent;
import java.awt.event.MouseWheelEvent;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.lang.reflect.InvocationTargetException;
import java.util.ArrayList;
import java.util.List;
import javax.swing.KeyStroke;
import javax.swing.SwingUtilities;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.wellwright.solver.model.ChannelKey;
import org.wellwright.solver.model.LevelKey;
import org.wellwright.viewer.Samples;
import org.wellwright.viewer.plot.AxisSpec;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.PlotFrame;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Viewport;

/** Events are dispatched to the canvas as the window system would. */
class FigureCanvasTest {
    private static final LevelKey LEVEL = new LevelKey(Samples.SYSTEM, Samples.CURVE, ChannelKey.ofOrbital(0), 0);
    private final FigureCanvas canvas = new FigureCanvas(Runnable::run, Runnable::run);
    private final List<String> picked = new ArrayList<>();
    private final List<Viewport> painted = new ArrayList<>();

    @BeforeEach
    void fill() {
        onEventThread(() -> {
            canvas.setSize(400, 300);
            canvas.onPick((spot, more) -> picked.add(spot.text() + more));
            canvas.show(new Square());
        });
        // The event of the new size comes after that.
        onEventThread(() -> {});
    }

    @Test
    void theWheelZoomsAroundThePointer() {
        wheel(100, 150, -2);
        Viewport view = canvas.view();
        double factor = 1.25 * 1.25;
        assertThat(view.right() - view.left()).isCloseTo(10 / factor, within(1e-12));
        // 2.5 was under the pointer and still is.
        assertThat((2.5 - view.left()) / (view.right() - view.left())).isCloseTo(0.25, within(1e-12));
        wheel(100, 150, 2);
        assertThat(canvas.view().left()).isCloseTo(0, within(1e-12));
        assertThat(canvas.view().right()).isCloseTo(10, within(1e-12));
    }

    @Test
    void draggingMovesWhatIsUnderThePointer() {
        mouse(MouseEvent.MOUSE_PRESSED, 100, 100, 0, 1);
        mouse(MouseEvent.MOUSE_DRAGGED, 140, 130, 0, 1);
        mouse(MouseEvent.MOUSE_RELEASED, 140, 130, 0, 1);
        mouse(MouseEvent.MOUSE_CLICKED, 140, 130, 0, 1);
        assertThat(canvas.view().left()).isCloseTo(-1, within(1e-12));
        assertThat(canvas.view().right()).isCloseTo(9, within(1e-12));
        assertThat(canvas.view().bottom()).isCloseTo(1, within(1e-12));
        assertThat(picked).isEmpty();
    }

    @Test
    void aDoubleClickAndZeroShowAllAgain() {
        wheel(100, 150, -2);
        mouse(MouseEvent.MOUSE_CLICKED, 10, 10, 0, 2);
        assertThat(canvas.view()).isEqualTo(Viewport.ALL);
        key(KeyEvent.VK_PLUS);
        assertThat(canvas.view().right() - canvas.view().left()).isCloseTo(8, within(1e-12));
        key(KeyEvent.VK_RIGHT);
        assertThat(canvas.view().left()).isCloseTo(1.8, within(1e-12));
        key(KeyEvent.VK_0);
        assertThat(canvas.view()).isEqualTo(Viewport.ALL);
    }

    @Test
    void aClickPicksWhatIsThere() {
        mouse(MouseEvent.MOUSE_CLICKED, 200, 150, 0, 1);
        mouse(MouseEvent.MOUSE_CLICKED, 200, 150, MouseEvent.CTRL_DOWN_MASK, 1);
        mouse(MouseEvent.MOUSE_CLICKED, 20, 20, 0, 1);
        assertThat(picked).containsExactly("a <b>false", "a <b>true");
    }

    @Test
    void theHintIsEscapedAndNothingIsHintedBesideIt() {
        assertThat(canvas.getToolTipText(event(MouseEvent.MOUSE_MOVED, 200, 150, 0, 0)))
                .isEqualTo("<html>a &lt;b&gt;");
        assertThat(canvas.getToolTipText(event(MouseEvent.MOUSE_MOVED, 20, 20, 0, 0)))
                .isNull();
    }

    @Test
    void aPictureIsPaintedOnceForOneChange() {
        painted.clear();
        onEventThread(() -> canvas.setView(canvas.view()));
        assertThat(painted).isEmpty();
        wheel(100, 150, -1);
        assertThat(painted).hasSize(1);
        BufferedImage image = new BufferedImage(400, 300, BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        canvas.paint(g);
        g.dispose();
        assertThat(painted).as("painting the window paints no picture").hasSize(1);
        assertThat(image.getRGB(200, 150) & 0xffffff).isEqualTo(0x00ff00);
    }

    private void wheel(int x, int y, int turns) {
        onEventThread(() -> canvas.dispatchEvent(new MouseWheelEvent(
                canvas, MouseEvent.MOUSE_WHEEL, 0, 0, x, y, 0, false, MouseWheelEvent.WHEEL_UNIT_SCROLL, 1, turns)));
    }

    private void mouse(int id, int x, int y, int modifiers, int clicks) {
        onEventThread(() -> canvas.dispatchEvent(event(id, x, y, modifiers, clicks)));
    }

    private MouseEvent event(int id, int x, int y, int modifiers, int clicks) {
        int held = id == MouseEvent.MOUSE_DRAGGED ? MouseEvent.BUTTON1_DOWN_MASK : 0;
        int button = id == MouseEvent.MOUSE_DRAGGED || id == MouseEvent.MOUSE_MOVED
                ? MouseEvent.NOBUTTON
                : MouseEvent.BUTTON1;
        return new MouseEvent(canvas, id, 0, modifiers | held, x, y, clicks, false, button);
    }

    private void key(int code) {
        Object name = canvas.getInputMap().get(KeyStroke.getKeyStroke(code, 0));
        onEventThread(() -> canvas.getActionMap().get(name).actionPerformed(null));
    }

    private static void onEventThread(Runnable action) {
        try {
            SwingUtilities.invokeAndWait(action);
        } catch (InterruptedException | InvocationTargetException e) {
            throw new AssertionError(e);
        }
    }

    /** A green picture over (0, 10)²; its middle can be pointed at. */
    private final class Square implements Picture {
        @Override
        public boolean movesAcross() {
            return true;
        }

        @Override
        public boolean movesUp() {
            return true;
        }

        @Override
        public Painted paint(Graphics2D g, int width, int height, PlotStyle style, Viewport view) {
            painted.add(view);
            g.setColor(Color.GREEN);
            g.fillRect(0, 0, width, height);
            AxisSpec axis = AxisSpec.of("", 0, 10);
            PlotFrame.Area area = new PlotFrame.Area(
                    new Rectangle2D.Double(0, 0, width, height), view.horizontal(axis), view.vertical(axis));
            return new Painted() {
                @Override
                public PlotFrame.Area area() {
                    return area;
                }

                @Override
                public Spot at(double x, double y) {
                    return Math.hypot(x - 200, y - 150) < 20 ? new Spot("a <b>", "", LEVEL) : null;
                }
            };
        }
    }
}
