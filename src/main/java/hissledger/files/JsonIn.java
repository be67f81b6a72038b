package hissledger.files;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.json.JsonReadFeature;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Reads a JSON file, comments and trailing commas allowed, into a tree that knows the place of every key and value. */
final class JsonIn {
    /** No file of this program comes near this size. */
    private static final int MOST_BYTES = 5_000_000;

    private static final int DEEPEST = 50;
    private static final int LONGEST_NUMBER = 1000;
    private static final String BYTE_ORDER_MARK = "\ufeff";
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .enable(JsonReadFeature.ALLOW_JAVA_COMMENTS)
            .enable(JsonReadFeature.ALLOW_TRAILING_COMMA)
            .enable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS)
            .streamReadConstraints(StreamReadConstraints.builder()
                    .maxNestingDepth(DEEPEST)
                    .maxNumberLength(LONGEST_NUMBER)
                    .build())
            .build();

    private JsonIn() {}

    /** The bytes of a file, refused where it is missing, no file, unreadable or far too large. */
    static byte[] bytes(Path file) throws InputException {
        String name = file.toString();
        try {
            if (Files.isDirectory(file)) {
                throw InputException.of(name, "is a folder; name a file in it");
            }
            long size = Files.size(file);
            if (size > MOST_BYTES) {
                throw tooLarge(name, "has " + size + " bytes");
            }
            // a pipe or a device states no size
            try (InputStream stream = Files.newInputStream(file)) {
                byte[] content = stream.readNBytes(MOST_BYTES + 1);
                if (content.length > MOST_BYTES) {
                    throw tooLarge(name, "has more bytes than it states");
                }
                return content;
            }
        } catch (NoSuchFileException missing) {
            throw InputException.of(name, "does not exist; check the path");
        } catch (IOException unreadable) {
            throw InputException.of(name, "cannot be read; check its permissions");
        }
    }

    private static InputException tooLarge(String name, String size) {
        return InputException.of(
                name, size + ", more than the " + MOST_BYTES + " that are read; is this the right file?");
    }

    /** A file's content as text, without the byte order mark that some editors write. */
    static String text(String file, byte[] content) throws InputException {
        try {
            String text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(content))
                    .toString();
            return text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text;
        } catch (CharacterCodingException other) {
            throw InputException.of(file, "is not text in UTF-8; save it in that encoding");
        }
    }

    /** The tree of a file's content. */
    static Node tree(String file, byte[] content) throws InputException {
        Faults faults = new Faults(file);
        // from characters, not bytes: columns count what the user sees
        try (JsonParser parser = FACTORY.createParser(text(file, content))) {
            if (parser.nextToken() == null) {
                throw InputException.of(file, "holds nothing; it should hold one JSON object { ... }");
            }
            Node node = whole(parser, faults);
            if (parser.nextToken() != null) {
                JsonLocation place = parser.currentTokenLocation();
                faults.at(
                        place.getLineNr(),
                        place.getColumnNr(),
                        "goes on after the end of the JSON value; remove what follows");
                faults.throwIfAny();
            }
            return node;
        } catch (JsonProcessingException broken) {
            JsonLocation place = broken.getLocation();
            faults.at(
                    place == null ? 1 : place.getLineNr(),
                    place == null ? 1 : Math.max(1, place.getColumnNr()),
                    "is not JSON from here on; look for a missing comma, quote, colon or bracket just before");
            faults.throwIfAny();
            throw new IllegalStateException("a fault was not thrown", broken);
        } catch (IOException impossible) {
            throw new IllegalStateException("reading from memory failed", impossible);
        }
    }

    private static Node whole(JsonParser parser, Faults faults) throws IOException, InputException {
        try {
            return value(parser, "");
        } catch (StreamConstraintsException beyond) {
            JsonLocation place = parser.currentTokenLocation();
            faults.at(
                    place.getLineNr(),
                    Math.max(1, place.getColumnNr()),
                    "goes beyond what is read: objects and lists in each other to a depth of " + DEEPEST
                            + ", numbers of " + LONGEST_NUMBER + " digits");
            faults.throwIfAny();
            throw new IllegalStateException("a fault was not thrown", beyond);
        }
    }

    private static Node value(JsonParser parser, String path) throws IOException {
        JsonLocation place = parser.currentTokenLocation();
        JsonToken token = parser.currentToken();
        return switch (token) {
            case START_OBJECT -> object(parser, path, place);
            case START_ARRAY -> list(parser, path, place);
            case VALUE_STRING -> leaf(Node.Kind.TEXT, parser, path, place);
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> leaf(Node.Kind.NUMBER, parser, path, place);
            case VALUE_TRUE, VALUE_FALSE -> leaf(Node.Kind.FLAG, parser, path, place);
            default -> leaf(Node.Kind.NOTHING, parser, path, place);
        };
    }

    private static Node leaf(Node.Kind kind, JsonParser parser, String path, JsonLocation place) throws IOException {
        return new Node(kind, parser.getText(), path, place.getLineNr(), place.getColumnNr(), List.of(), List.of());
    }

    private static Node object(JsonParser parser, String path, JsonLocation place) throws IOException {
        List<Node.Member> members = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_OBJECT) {
            JsonLocation key = parser.currentTokenLocation();
            String name = parser.currentName();
            parser.nextToken();
            Node value = value(parser, path.isEmpty() ? name : path + "." + name);
            members.add(new Node.Member(name, key.getLineNr(), key.getColumnNr(), value));
        }
        return new Node(Node.Kind.OBJECT, "", path, place.getLineNr(), place.getColumnNr(), members, List.of());
    }

    private static Node list(JsonParser parser, String path, JsonLocation place) throws IOException {
        List<Node> items = new ArrayList<>();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            items.add(value(parser, path + "[" + items.size() + "]"));
        }
        return new Node(Node.Kind.LIST, "", path, place.getLineNr(), place.getColumnNr(), List.of(), items);
    }
}
