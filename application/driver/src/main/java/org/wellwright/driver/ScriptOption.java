package org.wellwright.driver;

import java.nio.file.Path;
import org.netbeans.api.sendopts.CommandException;
import org.netbeans.spi.sendopts.Arg;
import org.netbeans.spi.sendopts.ArgsProcessor;
import org.netbeans.spi.sendopts.Env;
import org.openide.windows.WindowManager;

/** The option {@code --ui-script FILE}: runs the script on a thread of its own as soon as the window is up. */
public final class ScriptOption implements ArgsProcessor {
    /** The script's file, or null. Filled in by the platform. */
    @Arg(longName = "ui-script")
    public String script;

    @Override
    public void process(Env env) throws CommandException {
        Path file = env.getCurrentDirectory().toPath().resolve(script);
        WindowManager.getDefault()
                .invokeWhenUIReady(() -> new Thread(() -> ScriptRunner.run(file), "ui-script").start());
    }
}
