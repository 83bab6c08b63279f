package org.wellwright.driver;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The steps of one script file.
 *
 * @param file where it was read from; relative file names in its steps are relative to its folder
 * @param steps in order
 */
public record Script(Path file, List<Step> steps) {
    private static final Pattern WORD = Pattern.compile("\"([^\"]*)\"|(\\S+)");

    /**
     * One line.
     *
     * @param line its number, from 1
     * @param name the command's word
     * @param arguments the other words
     */
    public record Step(int line, String name, List<String> arguments) {
        /** Keeps its own copy of the words. */
        public Step {
            arguments = List.copyOf(arguments);
        }
    }

    /** Keeps its own copy of the steps. */
    public Script {
        steps = List.copyOf(steps);
    }

    /** Reads a script, in UTF-8. */
    public static Script read(Path file) throws IOException {
        List<Step> steps = new ArrayList<>();
        int number = 0;
        for (String line : Files.readAllLines(file)) {
            number++;
            List<String> words = words(line);
            if (!words.isEmpty() && !line.startsWith("#")) {
                steps.add(new Step(number, words.get(0), words.subList(1, words.size())));
            }
        }
        return new Script(file, steps);
    }

    /** The file a step names, relative to the script's folder. */
    public Path resolve(String name) {
        return file.resolveSibling(name);
    }

    static List<String> words(String line) {
        List<String> words = new ArrayList<>();
        Matcher matcher = WORD.matcher(line);
        while (matcher.find()) {
            words.add(matcher.group(1) != null ? matcher.group(1) : matcher.group(2));
        }
        return words;
    }
}
