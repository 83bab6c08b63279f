package org.wellwright.project.command;

import java.nio.file.Path;
import org.wellwright.project.Project;
import org.wellwright.project.file.ProjectFile;
import org.wellwright.solver.model.ModelDocument;

/** {@code validate}: reads a project and says what is wrong with it. */
final class ValidateCommand implements Command {
    @Override
    public Syntax syntax() {
        return new Syntax("validate", "Checks a project file: each fault with its line and JSON pointer.", "PROJECT");
    }

    @Override
    public int run(Input input, Console console) {
        Path file = ProjectArgument.path(input);
        ProjectFile.Content content = ProjectFile.open(file);
        Project project = content.sound();
        content.unknown().forEach(pointer -> console.say(file + " at " + pointer + ": this key is kept and not used"));
        ModelDocument document = project.document();
        console.print(file + ": valid; "
                + counted(document.systems().size(), "system") + ", "
                + counted(document.parameters().size(), "parameter") + ", "
                + counted(document.models().size(), "model") + ", "
                + document.data().size() + " data\n");
        return 0;
    }

    private static String counted(int count, String word) {
        return count + " " + word + (count == 1 ? "" : "s");
    }
}
