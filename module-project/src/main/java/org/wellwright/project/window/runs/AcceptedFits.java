package org.wellwright.project.window.runs;

import java.nio.file.Path;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.openide.awt.StatusDisplayer;
import org.openide.util.Lookup;
import org.openide.util.RequestProcessor;
import org.openide.util.lookup.ServiceProvider;
import org.wellwright.project.FitRecorder;
import org.wellwright.project.ProjectSession;
import org.wellwright.project.command.json.FitRecord;
import org.wellwright.project.run.RunHistory;
import org.wellwright.solver.WellwrightException;
import org.wellwright.solver.fit.FitResult;
import org.wellwright.solver.service.SolverService;

/** Writes accepted fits beside the project's file. */
@ServiceProvider(service = FitRecorder.class)
public final class AcceptedFits implements FitRecorder {
    private static final Logger LOG = Logger.getLogger(AcceptedFits.class.getName());
    private static final RequestProcessor WRITER = new RequestProcessor("run history", 1);

    @Override
    public void accepted(ProjectSession session, String digest, FitResult fit) {
        session.file().ifPresent(file -> WRITER.post(() -> write(session, file, digest, fit)));
    }

    private static void write(ProjectSession session, Path file, String digest, FitResult fit) {
        try {
            String solver = Lookup.getDefault().lookup(SolverService.class).version();
            RunHistory.of(file).add(FitRecord.of(file, digest, fit, solver));
            session.content().add(new Added());
        } catch (WellwrightException e) {
            // The fit itself is in the project; only its record is missing.
            LOG.log(Level.INFO, "no record of a fit", e);
            StatusDisplayer.getDefault().setStatusText(e.problem().sentence());
        }
    }

    /** In a session's lookup: its history has grown. */
    static final class Added {}
}
