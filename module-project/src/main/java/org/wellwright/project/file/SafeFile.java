package org.wellwright.project.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.Arrays;
import org.wellwright.solver.Problem;

/**
 * Reads and replaces files so that a crash at any moment leaves the old content or the new, never half of either.
 *
 * <p>Replacing writes a new file in the same folder, forces it to disk, keeps the old one as NAME.bak and renames the
 * new one over NAME.
 */
public final class SafeFile {
    /** Larger files are refused. */
    public static final long LARGEST = 256L << 20;

    private SafeFile() {}

    /** The name under which the previous content is kept. */
    public static String backupName(String file) {
        return file + ".bak";
    }

    /**
     * All bytes of a file.
     *
     * @throws ProjectFileException if there is none, it is a folder, it cannot be read, or it is larger than
     *     {@link #LARGEST}
     */
    public static byte[] read(Path file) {
        try {
            if (Files.isDirectory(file)) {
                throw new ProjectFileException(
                        new Problem("this is a folder", file.toString(), "name the file inside it"));
            }
            if (Files.size(file) > LARGEST) {
                throw new ProjectFileException(new Problem(
                        "the file is larger than " + (LARGEST >> 20) + " MiB",
                        file.toString(),
                        "is it the file you meant?"));
            }
            return Files.readAllBytes(file);
        } catch (NoSuchFileException e) {
            throw new ProjectFileException(
                    new Problem("there is no such file", file.toString(), "check the name and the folder"), e);
        } catch (IOException e) {
            throw new ProjectFileException(
                    new Problem("the file cannot be read: " + reason(e), file.toString(), "check its permissions"), e);
        }
    }

    /**
     * Replaces the content of a file, or makes it; a symbolic link keeps pointing where it did.
     *
     * @param backup whether the previous content is kept beside it
     * @throws ProjectFileException if it cannot be written; the old content is then still there
     */
    public static void replace(Path file, byte[] content, boolean backup) {
        Path fresh = null;
        try {
            Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
            if (Files.isDirectory(target)) {
                throw new ProjectFileException(new Problem("this is a folder", file.toString(), "name a file"));
            }
            boolean there = Files.exists(target);
            if (there && backup && Arrays.equals(Files.readAllBytes(target), content)) {
                return;
            }
            fresh = Files.createTempFile(target.getParent(), "." + target.getFileName(), ".new");
            if (there) {
                copyPermissions(target, fresh);
            } else {
                openPermissions(fresh);
            }
            write(fresh, content);
            if (there && backup) {
                keep(target);
            }
            move(fresh, target);
            forceFolder(target.getParent());
        } catch (IOException e) {
            throw new ProjectFileException(
                    new Problem(
                            "the file cannot be written: " + reason(e),
                            file.toString(),
                            "check the folder's permissions and free space"),
                    e);
        } finally {
            discard(fresh);
        }
    }

    /** Why an operation on a file failed, in plain words. */
    public static String reason(IOException e) {
        String name = e.getClass().getSimpleName();
        return switch (name) {
            case "AccessDeniedException" -> "access denied";
            case "NoSuchFileException" -> "there is no such file or folder";
            case "FileAlreadyExistsException" -> "a file of that name is in the way";
            default -> {
                String message = e.getMessage();
                yield message == null ? name : message;
            }
        };
    }

    private static void write(Path file, byte[] content) throws IOException {
        try (FileChannel channel =
                FileChannel.open(file, StandardOpenOption.WRITE, StandardOpenOption.TRUNCATE_EXISTING)) {
            ByteBuffer bytes = ByteBuffer.wrap(content);
            while (bytes.hasRemaining()) {
                channel.write(bytes);
            }
            channel.force(true);
        }
    }

    /** The backup is a second name of the old content while the rename happens, so NAME itself is never absent. */
    private static void keep(Path target) throws IOException {
        Path backup = target.resolveSibling(backupName(target.getFileName().toString()));
        Path spare = Files.createTempFile(target.getParent(), "." + target.getFileName(), ".old");
        try {
            Files.copy(target, spare, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.COPY_ATTRIBUTES);
            move(spare, backup);
        } finally {
            discard(spare);
        }
    }

    private static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    private static void copyPermissions(Path from, Path to) throws IOException {
        if (Files.getFileStore(from).supportsFileAttributeView("posix")) {
            Files.setPosixFilePermissions(to, Files.getPosixFilePermissions(from, LinkOption.NOFOLLOW_LINKS));
        }
    }

    /**
     * Temporary files are private; a new project is as readable as the folder lets any new file be (read by all,
     * written by the owner).
     */
    private static void openPermissions(Path file) throws IOException {
        if (Files.getFileStore(file).supportsFileAttributeView("posix")) {
            Files.setPosixFilePermissions(file, java.nio.file.attribute.PosixFilePermissions.fromString("rw-r--r--"));
        }
    }

    private static void forceFolder(Path folder) {
        try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
            channel.force(true);
        } catch (IOException e) {
            // Some systems cannot open a folder; the rename is then as durable as the system makes it.
            return;
        }
    }

    private static void discard(Path file) {
        if (file == null) {
            return;
        }
        try {
            Files.deleteIfExists(file);
        } catch (IOException e) {
            // A left-over temporary file harms nothing.
            return;
        }
    }
}
