package org.wellwright.viewer.picture;

import java.awt.Color;
import java.awt.Cursor;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.GraphicsEnvironment;
import java.awt.RenderingHints;
import java.awt.event.ActionEvent;
import java.awt.event.ComponentAdapter;
import java.awt.event.ComponentEvent;
import java.awt.event.KeyEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.event.MouseWheelEvent;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.concurrent.Executor;
import java.util.function.BiConsumer;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.AbstractAction;
import javax.swing.JComponent;
import javax.swing.KeyStroke;
import javax.swing.ToolTipManager;
import org.wellwright.branding.ChartTheme;
import org.wellwright.viewer.plot.Picture;
import org.wellwright.viewer.plot.PlotStyle;
import org.wellwright.viewer.plot.Viewport;

/**
 * Shows a picture: painted off the event thread at the screen's own pixels. The wheel and + − zoom, dragging and the
 * arrow keys move, 0 and a double click show all again, a click selects. Event thread only.
 */
public final class FigureCanvas extends JComponent {
    private static final long serialVersionUID = 1L;
    private static final double STEP = 1.25;
    private static final int STILL = 4;

    private final transient Latest rendering;
    private final transient Executor ui;
    private transient Picture picture;
    private transient Viewport view = Viewport.ALL;
    private transient Rendered rendered;
    private transient BiConsumer<Picture.Spot, Boolean> pick = (spot, more) -> {};

    private record Rendered(BufferedImage image, Picture.Painted painted, Picture picture, Viewport view) {}

    /**
     * An empty canvas.
     *
     * @param worker paints
     * @param ui runs on the event thread
     */
    public FigureCanvas(Executor worker, Executor ui) {
        this.rendering = new Latest(worker);
        this.ui = ui;
        setFocusable(true);
        setOpaque(true);
        setPreferredSize(new Dimension(640, 420));
        setMinimumSize(new Dimension(200, 140));
        if (!GraphicsEnvironment.isHeadless()) {
            ToolTipManager.sharedInstance().registerComponent(this);
        }
        addComponentListener(new ComponentAdapter() {
            @Override
            public void componentResized(ComponentEvent event) {
                render();
            }
        });
        Hand hand = new Hand();
        addMouseListener(hand);
        addMouseMotionListener(hand);
        addMouseWheelListener(hand);
        bind(KeyEvent.VK_PLUS, () -> zoom(STEP));
        bind(KeyEvent.VK_ADD, () -> zoom(STEP));
        bind(KeyEvent.VK_EQUALS, () -> zoom(STEP));
        bind(KeyEvent.VK_MINUS, () -> zoom(1 / STEP));
        bind(KeyEvent.VK_SUBTRACT, () -> zoom(1 / STEP));
        bind(KeyEvent.VK_0, this::showAll);
        bind(KeyEvent.VK_NUMPAD0, this::showAll);
        bind(KeyEvent.VK_LEFT, () -> move(0.1, 0));
        bind(KeyEvent.VK_RIGHT, () -> move(-0.1, 0));
        bind(KeyEvent.VK_UP, () -> move(0, 0.1));
        bind(KeyEvent.VK_DOWN, () -> move(0, -0.1));
    }

    private void bind(int key, Runnable action) {
        String name = "canvas." + KeyEvent.getKeyText(key);
        getInputMap().put(KeyStroke.getKeyStroke(key, 0), name);
        getActionMap().put(name, new AbstractAction() {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                action.run();
            }
        });
    }

    /** Who hears of a click on something: the spot, and whether it was with Ctrl or Shift. */
    public void onPick(BiConsumer<Picture.Spot, Boolean> listener) {
        pick = listener;
    }

    /** Shows a picture, or nothing; what is zoomed stays zoomed. */
    public void show(Picture next) {
        picture = next;
        if (next == null) {
            rendered = null;
            repaint();
        } else {
            render();
        }
    }

    /** The part of the axes that is shown. */
    public Viewport view() {
        return view;
    }

    /** Shows a part of the axes. */
    public void setView(Viewport next) {
        if (!next.equals(view)) {
            view = next;
            render();
        }
    }

    /** Shows the whole picture. */
    public void showAll() {
        setView(Viewport.ALL);
    }

    /** Zooms around the middle. */
    public void zoom(double factor) {
        if (rendered != null) {
            Rectangle2D box = rendered.painted().area().area();
            zoom(box.getCenterX(), box.getCenterY(), factor);
        }
    }

    private void zoom(double x, double y, double factor) {
        if (ready()) {
            setView(rendered.view()
                    .zoomed(rendered.painted().area(), x, y, factor, picture.movesAcross(), picture.movesUp()));
        }
    }

    private void move(double across, double up) {
        if (ready()) {
            Rectangle2D box = rendered.painted().area().area();
            setView(rendered.view()
                    .moved(
                            rendered.painted().area(),
                            across * box.getWidth(),
                            up * box.getHeight(),
                            picture.movesAcross(),
                            picture.movesUp()));
        }
    }

    private boolean ready() {
        return rendered != null && picture != null;
    }

    /** Paints the picture again, after the theme has changed for instance. */
    public void render() {
        int width = getWidth();
        int height = getHeight();
        Picture shown = picture;
        if (shown == null || width < 40 || height < 40) {
            return;
        }
        Viewport part = view;
        double scale = scale();
        PlotStyle style = new PlotStyle(ChartTheme.current(), ChartTheme.font(Font.PLAIN, 1));
        rendering.run(() -> {
            BufferedImage image = new BufferedImage(
                    (int) Math.ceil(width * scale), (int) Math.ceil(height * scale), BufferedImage.TYPE_INT_RGB);
            Graphics2D g = image.createGraphics();
            g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
            g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
            g.scale(scale, scale);
            Picture.Painted painted = shown.paint(g, width, height, style, part);
            g.dispose();
            ui.execute(() -> {
                if (picture != null) {
                    rendered = new Rendered(image, painted, shown, part);
                    repaint();
                }
            });
        });
    }

    private double scale() {
        return getGraphicsConfiguration() == null
                ? 1
                : getGraphicsConfiguration().getDefaultTransform().getScaleX();
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        Color ground = ChartTheme.current().ground();
        g.setColor(ground);
        g.fillRect(0, 0, getWidth(), getHeight());
        if (rendered != null) {
            double scale = scale();
            g.drawImage(rendered.image(), AffineTransform.getScaleInstance(1 / scale, 1 / scale), null);
        }
        if (isFocusOwner()) {
            g.setColor(ChartTheme.current().axis());
            g.drawRect(0, 0, getWidth() - 1, getHeight() - 1);
        }
        g.dispose();
    }

    @Override
    public void updateUI() {
        super.updateUI();
        if (rendering != null) {
            render();
        }
    }

    @Override
    public String getToolTipText(MouseEvent event) {
        Picture.Spot spot = rendered == null ? null : rendered.painted().at(event.getX(), event.getY());
        return spot == null ? null : html(spot.text());
    }

    private static String html(String text) {
        String safe = text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
        return "<html>" + safe.replace("\n", "<br>");
    }

    @Override
    public AccessibleContext getAccessibleContext() {
        if (accessibleContext == null) {
            accessibleContext = new AccessibleJComponent() {
                private static final long serialVersionUID = 1L;

                @Override
                public AccessibleRole getAccessibleRole() {
                    return AccessibleRole.CANVAS;
                }
            };
        }
        return accessibleContext;
    }

    /** What the mouse does. */
    private final class Hand extends MouseAdapter {
        private int startX;
        private int startY;
        private Viewport before;
        private transient Picture.Painted painted;
        private boolean moved;

        @Override
        public void mousePressed(MouseEvent event) {
            requestFocusInWindow();
            startX = event.getX();
            startY = event.getY();
            moved = false;
            painted = rendered == null ? null : rendered.painted();
            before = rendered == null ? view : rendered.view();
        }

        @Override
        public void mouseDragged(MouseEvent event) {
            int dx = event.getX() - startX;
            int dy = event.getY() - startY;
            if (painted == null || picture == null || !moved && Math.hypot(dx, dy) < STILL) {
                return;
            }
            moved = true;
            setCursor(Cursor.getPredefinedCursor(Cursor.MOVE_CURSOR));
            setView(before.moved(painted.area(), dx, dy, picture.movesAcross(), picture.movesUp()));
        }

        @Override
        public void mouseReleased(MouseEvent event) {
            setCursor(Cursor.getDefaultCursor());
            painted = null;
        }

        @Override
        public void mouseClicked(MouseEvent event) {
            if (moved || rendered == null || event.getButton() != MouseEvent.BUTTON1) {
                return;
            }
            Picture.Spot spot = rendered.painted().at(event.getX(), event.getY());
            if (event.getClickCount() == 2 && (spot == null || spot.level() == null)) {
                showAll();
            } else if (spot != null && spot.level() != null && event.getClickCount() == 1) {
                pick.accept(spot, event.isControlDown() || event.isShiftDown() || event.isMetaDown());
            }
        }

        @Override
        public void mouseWheelMoved(MouseWheelEvent event) {
            zoom(event.getX(), event.getY(), Math.pow(STEP, -event.getPreciseWheelRotation()));
        }
    }
}
