package org.wellwright.driver;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import javax.swing.SwingUtilities;

/**
 * Measures how long the event thread keeps an event waiting: one empty event every few milliseconds, each timed from
 * posting to running.
 */
final class Heartbeat {
    private static final long PERIOD_MILLIS = 5;

    private final List<Double> waits = Collections.synchronizedList(new ArrayList<>());
    private final Thread pulse = new Thread(this::beat, "heartbeat");

    static Heartbeat start() {
        Heartbeat heartbeat = new Heartbeat();
        heartbeat.pulse.setDaemon(true);
        heartbeat.pulse.start();
        return heartbeat;
    }

    /** Ends the measurement: "beats N, median A ms, p99 B ms, max C ms". */
    String stop() {
        pulse.interrupt();
        List<Double> sorted;
        synchronized (waits) {
            sorted = new ArrayList<>(waits);
        }
        if (sorted.isEmpty()) {
            return "beats 0";
        }
        Collections.sort(sorted);
        int last = sorted.size() - 1;
        return "beats %d, median %.2f ms, p99 %.2f ms, max %.2f ms"
                .formatted(
                        sorted.size(),
                        sorted.get(last / 2),
                        sorted.get((int) Math.ceil(0.99 * last)),
                        sorted.get(last));
    }

    private void beat() {
        try {
            while (true) {
                long posted = System.nanoTime();
                SwingUtilities.invokeLater(() -> waits.add((System.nanoTime() - posted) / 1e6));
                Thread.sleep(PERIOD_MILLIS);
            }
        } catch (InterruptedException stopped) {
            Thread.currentThread().interrupt();
        }
    }
}
