package org.wellwright.project.window;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.netbeans.api.sendopts.CommandException;
import org.netbeans.spi.sendopts.Arg;
import org.netbeans.spi.sendopts.ArgsProcessor;
import org.netbeans.spi.sendopts.Description;
import org.netbeans.spi.sendopts.Env;
import org.openide.util.NbBundle.Messages;
import org.openide.windows.WindowManager;

/** Project files on the command line: {@code wellwright FILE…} or {@code wellwright --open FILE…}. */
public final class NamedFiles implements ArgsProcessor {
    /** The files' names; filled in by the platform. */
    @Arg(longName = "open", implicit = true)
    @Description(shortDescription = "#MSG_OpenOption")
    @Messages("MSG_OpenOption=open these project files")
    public String[] files;

    @Override
    public void process(Env env) throws CommandException {
        List<Path> paths = new ArrayList<>();
        for (String file : files) {
            paths.add(env.getCurrentDirectory()
                    .toPath()
                    .resolve(file)
                    .toAbsolutePath()
                    .normalize());
        }
        WindowManager.getDefault().invokeWhenUIReady(() -> StartUp.openNamed(paths));
    }
}
