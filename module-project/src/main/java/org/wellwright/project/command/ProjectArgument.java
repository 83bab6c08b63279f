package org.wellwright.project.command;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import org.wellwright.project.Project;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.project.file.ProjectFileException;
import org.wellwright.solver.Problem;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.units.Names;

/** The project file and the model that a command names. */
final class ProjectArgument {
    private ProjectArgument() {}

    /** The first positional argument as a path. */
    static Path path(Input input) {
        return path(input.positionals().get(0));
    }

    /** A path from an argument. */
    static Path path(String text) {
        try {
            return Path.of(text);
        } catch (InvalidPathException e) {
            throw new UsageException("'" + Names.shortened(text) + "' is not a file name", "check the name");
        }
    }

    /** The project, whose parts must fit each other. */
    static Project read(Path file) {
        return ProjectFile.open(file).sound();
    }

    /** The model that {@code --model} names; without it the project's first. */
    static Model model(Input input, Project project, Path file) {
        List<Model> models = project.document().models();
        if (models.isEmpty()) {
            throw new ProjectFileException(
                    new Problem("the project has no model", file.toString(), "add one under \"models\""));
        }
        String name = input.value("model");
        if (name == null) {
            return models.get(0);
        }
        for (Model model : models) {
            if (model.name().equals(name)) {
                return model;
            }
        }
        throw new UsageException(
                "the project has no model '" + Names.shortened(name) + "'",
                Names.remedy(name, models.stream().map(Model::name).toList()));
    }
}
