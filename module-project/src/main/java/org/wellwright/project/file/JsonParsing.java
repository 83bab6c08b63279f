package org.wellwright.project.file;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.project.file.JsonValue.JsonArray;
import org.wellwright.project.file.JsonValue.JsonLiteral;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.Problem;
import tools.jackson.core.JacksonException;
import tools.jackson.core.JsonParser;
import tools.jackson.core.JsonToken;
import tools.jackson.core.ObjectReadContext;
import tools.jackson.core.StreamReadConstraints;
import tools.jackson.core.StreamReadFeature;
import tools.jackson.core.TokenStreamLocation;
import tools.jackson.core.exc.StreamConstraintsException;
import tools.jackson.core.json.JsonFactory;

/** Turns UTF-8 JSON into a {@link JsonDocument}; every fault names its line. */
final class JsonParsing {
    /** Brackets inside brackets. */
    static final int NESTING = 60;

    private static final int NUMBER_LENGTH = 300;

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(NESTING)
                    .maxNumberLength(NUMBER_LENGTH)
                    .maxNameLength(2_000)
                    .maxStringLength(5_000_000)
                    .build())
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .build();

    private final JsonParser parser;
    private final Map<String, Integer> lines = new HashMap<>();
    private int line = 1;

    private JsonParsing(JsonParser parser) {
        this.parser = parser;
    }

    /**
     * Parses a text.
     *
     * @param bytes UTF-8, with or without a byte order mark
     * @param file name for messages
     * @throws ProjectFileException if it is empty, not UTF-8, not JSON, or nested deeper than {@link #NESTING}; names
     *     the line
     */
    static JsonDocument parse(byte[] bytes, String file) {
        String text = decode(bytes, file);
        if (text.isBlank()) {
            throw new ProjectFileException(new Problem(
                    "the file is empty",
                    file,
                    "restore it from " + SafeFile.backupName(file) + " or start a new project"));
        }
        // A parser of a text in memory holds nothing that must be closed.
        JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), text);
        JsonParsing parsing = new JsonParsing(parser);
        try {
            parser.nextToken();
            JsonValue root = parsing.value("");
            if (parser.nextToken() != null) {
                throw new ProjectFileException(new Problem(
                        "there is more after the end of the JSON value",
                        file + " line " + parser.currentTokenLocation().getLineNr(),
                        "remove what follows the last bracket"));
            }
            return new JsonDocument(root, Map.copyOf(parsing.lines));
        } catch (StreamConstraintsException e) {
            throw new ProjectFileException(
                    new Problem(constraint(e), file + " line " + parsing.line, "write it plainer"), e);
        } catch (JacksonException e) {
            throw new ProjectFileException(
                    new Problem(
                            "this is not JSON: " + plain(e),
                            place(file, e, text),
                            "mend the line or restore " + SafeFile.backupName(file)),
                    e);
        }
    }

    /** A value from a text that {@link JsonWriting#compact} wrote. */
    static JsonValue fragment(String json) {
        try (JsonParser parser = FACTORY.createParser(ObjectReadContext.empty(), json)) {
            parser.nextToken();
            return new JsonParsing(parser).value("");
        }
    }

    private static String decode(byte[] bytes, String file) {
        int start = bytes.length >= 3 && bytes[0] == (byte) 0xEF && bytes[1] == (byte) 0xBB && bytes[2] == (byte) 0xBF
                ? 3
                : 0;
        ByteBuffer in = ByteBuffer.wrap(bytes, start, bytes.length - start);
        try {
            return StandardCharsets.UTF_8
                    .newDecoder()
                    .onMalformedInput(CodingErrorAction.REPORT)
                    .onUnmappableCharacter(CodingErrorAction.REPORT)
                    .decode(in)
                    .toString();
        } catch (CharacterCodingException e) {
            int line = 1;
            for (int i = 0; i < in.position(); i++) {
                if (bytes[i] == '\n') {
                    line++;
                }
            }
            throw new ProjectFileException(
                    new Problem(
                            "the file is not UTF-8 text (byte " + in.position() + ")",
                            file + " line " + line,
                            "save it as UTF-8, or restore " + SafeFile.backupName(file)),
                    e);
        }
    }

    private JsonValue value(String pointer) {
        return switch (parser.currentToken()) {
            case START_OBJECT -> object(pointer);
            case START_ARRAY -> array(pointer);
            case VALUE_STRING -> new JsonText(parser.getString());
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> new JsonNumber(parser.getString());
            case VALUE_TRUE -> JsonLiteral.TRUE;
            case VALUE_FALSE -> JsonLiteral.FALSE;
            case VALUE_NULL -> JsonLiteral.NULL;
            default -> throw new IllegalStateException("no JSON value starts with " + parser.currentToken());
        };
    }

    private JsonObject object(String pointer) {
        mark(pointer);
        Map<String, JsonValue> members = new LinkedHashMap<>();
        while (parser.nextToken() == JsonToken.PROPERTY_NAME) {
            String key = parser.currentName();
            String inside = pointer + "/" + JsonDocument.step(key);
            mark(inside);
            parser.nextToken();
            members.put(key, value(inside));
        }
        return new JsonObject(members);
    }

    private JsonArray array(String pointer) {
        mark(pointer);
        List<JsonValue> items = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            String inside = pointer + "/" + items.size();
            mark(inside);
            items.add(value(inside));
        }
        return new JsonArray(items);
    }

    private void mark(String pointer) {
        line = parser.currentTokenLocation().getLineNr();
        lines.putIfAbsent(pointer, line);
    }

    private static String constraint(StreamConstraintsException e) {
        String message = e.getOriginalMessage();
        if (message.contains("nesting")) {
            return "brackets are nested deeper than " + NESTING;
        }
        if (message.contains("Number")) {
            return "a number is longer than " + NUMBER_LENGTH + " characters";
        }
        return "a name or text is too long";
    }

    private static String place(String file, JacksonException e, String text) {
        TokenStreamLocation at = e.getLocation();
        if (at == null || at.getLineNr() < 1) {
            return file;
        }
        long last = Math.max(1, text.lines().count());
        return file + " line " + Math.min(at.getLineNr(), last) + " column " + at.getColumnNr();
    }

    /** The parser's words without its hints about its own classes and features. */
    private static String plain(JacksonException e) {
        String message = e.getOriginalMessage();
        if (message.contains("end-of-input") || message.contains("Unexpected close")) {
            return message.contains("close") ? "a closing bracket does not match" : "it ends too early";
        }
        int cut = message.length();
        for (String hint : List.of("(for ", "(start marker", "(set ", "; maybe", "\n", " at [")) {
            int at = message.indexOf(hint);
            if (at > 0) {
                cut = Math.min(cut, at);
            }
        }
        String words = message.substring(0, Math.min(cut, 160)).strip();
        return Character.toLowerCase(words.charAt(0)) + words.substring(1);
    }
}
