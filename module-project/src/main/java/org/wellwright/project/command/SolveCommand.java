package org.wellwright.project.command;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.wellwright.project.Project;
import org.wellwright.project.ProjectSolver;
import org.wellwright.project.SolveScope;
import org.wellwright.project.SolvedChannel;
import org.wellwright.project.SolvedModel;
import org.wellwright.project.command.json.LevelListing;
import org.wellwright.project.command.json.LevelListing.ChannelRow;
import org.wellwright.project.command.json.LevelListing.LevelRow;
import org.wellwright.project.command.json.LevelListing.Place;
import org.wellwright.solver.InvalidModelException;
import org.wellwright.solver.model.LevelNames;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.radial.SolveMonitor;
import org.wellwright.solver.units.UnitSystem;

/** {@code solve}: the levels of a model of a project. */
final class SolveCommand implements Command {
    @Override
    public Syntax syntax() {
        return new Syntax("solve", "Levels of a project's model at the values in the file.", "PROJECT")
                .option("model", "NAME", "which model (without it the first)")
                .option("l", "RANGE", "angular momenta (without it those of the data, and 0..2)")
                .option("count", "N", "levels of each channel (without it those of the data, and some more)")
                .result("table|csv|json");
    }

    @Override
    public int run(Input input, Console console) {
        Input.Format format = input.format();
        SolveScope scope = new SolveScope(
                input.has("l") ? Orbitals.parse(input.value("l")) : List.of(), input.count("count", 1, 0));
        Path file = ProjectArgument.path(input);
        Project project = ProjectArgument.read(file);
        Model model = ProjectArgument.model(input, project, file);
        SolvedModel solved =
                new ProjectSolver(project.document(), Services.solver()).solve(model, scope, SolveMonitor.NONE);
        if (solved.channels().isEmpty() && !solved.problems().isEmpty()) {
            throw new InvalidModelException(solved.problems().get(0));
        }
        solved.problems().forEach(console::fault);
        boolean whole = solved.problems().isEmpty();
        LevelNames names = LevelNames.of(project.document());
        List<ChannelRow> channels = new ArrayList<>();
        List<LevelRow> levels = new ArrayList<>();
        for (SolvedChannel channel : solved.channels()) {
            Place place = new Place(model.name(), channel.curve(), channel.system(), channel.channel());
            whole &= Spectra.list(
                    place,
                    index -> names.shortName(channel.key(index)),
                    channel.origin(),
                    channel.spectrum(),
                    channels,
                    levels,
                    console);
        }
        UnitSystem units = UnitSystem.named(project.document().units());
        LevelListing listing =
                new LevelListing(units.energy().symbol(), units.length().symbol(), channels, levels);
        console.result(input, LevelListings.print(listing, format));
        return whole ? 0 : 1;
    }
}
