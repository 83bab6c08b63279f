package org.wellwright.project.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import org.wellwright.project.Project;
import org.wellwright.solver.Problem;

/**
 * The right to write a project: a lock of the operating system on NAME.wellwright.lock, which ends with its owner
 * whatever becomes of it. Readers need none.
 */
public final class ProjectLock implements AutoCloseable {
    private final Path project;
    private final Path file;
    private final FileChannel channel;

    private ProjectLock(Path project, Path file, FileChannel channel) {
        this.project = project;
        this.file = file;
        this.channel = channel;
    }

    /**
     * Takes the lock of a project file.
     *
     * @throws ProjectFileException if somebody else has it (says who), or the folder cannot be written
     */
    public static ProjectLock take(Path project) {
        Path file = project.resolveSibling(project.getFileName() + ".lock");
        String owner = "process " + ProcessHandle.current().pid() + " since "
                + Instant.now().truncatedTo(ChronoUnit.MILLIS) + " #" + System.nanoTime();
        try {
            while (true) {
                FileChannel channel = FileChannel.open(
                        file, StandardOpenOption.CREATE, StandardOpenOption.READ, StandardOpenOption.WRITE);
                FileLock lock = attempt(channel);
                if (lock == null) {
                    channel.close();
                    throw new ProjectFileException(new Problem(
                            "the project is being written by " + owner(file),
                            project.toString(),
                            "close it there, then try again"));
                }
                channel.truncate(0);
                channel.write(ByteBuffer.wrap(owner.getBytes(StandardCharsets.UTF_8)));
                // A former owner may have removed the file between opening and locking it; then the lock is on a file
                // that nobody finds.
                if (Files.exists(file) && Files.readString(file).equals(owner)) {
                    return new ProjectLock(project, file, channel);
                }
                channel.close();
            }
        } catch (IOException e) {
            throw new ProjectFileException(
                    new Problem(
                            "the project cannot be locked: " + SafeFile.reason(e),
                            project.toString(),
                            "check the folder's permissions"),
                    e);
        }
    }

    /**
     * Saves the project that is locked.
     *
     * @throws ProjectFileException if it cannot be written; the file is then as before
     */
    public void save(Project content) {
        ProjectFile.save(project, content);
    }

    private static FileLock attempt(FileChannel channel) throws IOException {
        try {
            return channel.tryLock();
        } catch (OverlappingFileLockException e) {
            // This process has it already.
            return null;
        }
    }

    private static String owner(Path file) throws IOException {
        String text = Files.readString(file);
        int mark = text.indexOf(" #");
        return mark < 0 ? "another program" : text.substring(0, mark);
    }

    @Override
    public void close() {
        try {
            Files.deleteIfExists(file);
            channel.close();
        } catch (IOException e) {
            // The system releases the lock when the process ends.
            return;
        }
    }
}
