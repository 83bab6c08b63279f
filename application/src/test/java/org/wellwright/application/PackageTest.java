package org.wellwright.application;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermission;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import java.util.zip.ZipFile;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class PackageTest {
    private static final long MOST_BYTES = 25_000_000;

    @TempDir
    Path scratch;

    @ParameterizedTest
    @ValueSource(strings = {"wellwright", "wellwright-batch"})
    void aLauncherIsExecutableInTheFolderAndInTheZip(String launcher) throws IOException {
        assertThat(PackagedApplication.built().folder().resolve("bin").resolve(launcher))
                .isExecutable();
        try (FileSystem zip = FileSystems.newFileSystem(zip(), Map.of("enablePosixFileAttributes", true))) {
            assertThat(Files.getPosixFilePermissions(zip.getPath("wellwright", "bin", launcher)))
                    .contains(PosixFilePermission.OWNER_EXECUTE, PosixFilePermission.OTHERS_EXECUTE);
        }
    }

    @Test
    void theZipIsSmallAndHoldsNoTestDriverAndNoExampleModule() throws IOException {
        Path zip = zip();
        assertThat(Files.size(zip)).isLessThan(MOST_BYTES);
        try (ZipFile content = new ZipFile(zip.toFile())) {
            List<String> names = content.stream().map(entry -> entry.getName()).toList();
            assertThat(names).contains("wellwright/bin/wellwright", "wellwright/bin/wellwright-batch");
            assertThat(names)
                    .noneMatch(name ->
                            name.contains("driver") || name.contains("example-family") || name.endsWith(".jsa"));
        }
    }

    @Test
    void everyThirdPartyJarIsPackagedOnce() throws IOException {
        try (Stream<Path> files =
                Files.walk(PackagedApplication.built().folder().resolve("wellwright/modules/ext"))) {
            List<String> jars = files.map(file -> file.getFileName().toString())
                    .filter(name -> name.endsWith(".jar"))
                    .toList();
            assertThat(jars).contains("commons-math3.jar", "jfreechart.jar").doesNotHaveDuplicates();
        }
    }

    @Test
    void theWindowLauncherSaysThatThereIsNoDisplay() throws Exception {
        ProcessBuilder process = new ProcessBuilder(
                PackagedApplication.built().folder().resolve("bin/wellwright").toString());
        process.environment().remove("DISPLAY");
        PackagedApplication.Outcome outcome = PackagedApplication.run(process, scratch);
        assertThat(outcome.status()).isEqualTo(2);
        assertThat(outcome.output()).isEmpty();
        assertThat(outcome.errors()).hasLineCount(1).contains("DISPLAY is not set", "wellwright-batch");
    }

    private static Path zip() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("target"))) {
            return files.filter(file -> file.getFileName().toString().matches("wellwright-.*\\.zip"))
                    .findFirst()
                    .orElseThrow()
                    .toAbsolutePath();
        }
    }
}
