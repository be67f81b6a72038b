package hissledger.files;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.StringWriter;
import java.util.Map;
import java.util.OptionalDouble;

/** Writes a tree of maps, lists, numbers, texts and flags as JSON. An empty {@link OptionalDouble} becomes {@code null}. */
public final class JsonOut {
    private static final JsonFactory FACTORY = new JsonFactory();

    private JsonOut() {}

    /**
     * The tree as indented JSON, ended by a line feed.
     *
     * @throws IllegalArgumentException if a number is not finite or a value is of no JSON kind
     */
    public static String text(Map<String, ?> tree) {
        StringWriter text = new StringWriter();
        try (JsonGenerator generator = FACTORY.createGenerator(text)) {
            generator.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(new DefaultIndenter("  ", "\n")));
            write(generator, tree);
        } catch (IOException impossible) {
            throw new IllegalStateException("writing to memory failed", impossible);
        }
        return text.append('\n').toString();
    }

    private static void write(JsonGenerator generator, Object value) throws IOException {
        if (value instanceof Map<?, ?> map) {
            generator.writeStartObject();
            for (Map.Entry<?, ?> entry : map.entrySet()) {
                generator.writeFieldName(String.valueOf(entry.getKey()));
                write(generator, entry.getValue());
            }
            generator.writeEndObject();
        } else if (value instanceof Iterable<?> list) {
            generator.writeStartArray();
            for (Object item : list) {
                write(generator, item);
            }
            generator.writeEndArray();
        } else if (value instanceof OptionalDouble optional) {
            if (optional.isPresent()) {
                number(generator, optional.getAsDouble());
            } else {
                generator.writeNull();
            }
        } else if (value instanceof Double number) {
            number(generator, number);
        } else if (value instanceof Integer whole) {
            generator.writeNumber(whole);
        } else if (value instanceof Boolean flag) {
            generator.writeBoolean(flag);
        } else if (value instanceof String string) {
            generator.writeString(string);
        } else {
            throw new IllegalArgumentException(
                    "no JSON for a " + value.getClass().getSimpleName());
        }
    }

    private static void number(JsonGenerator generator, double value) throws IOException {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("JSON has no number for " + value);
        }
        generator.writeNumber(value);
    }
}
