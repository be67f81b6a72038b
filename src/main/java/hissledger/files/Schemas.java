package hissledger.files;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;

/**
 * JSON Schema (draft 2020-12) of the files, made from the very keys and values that read them. It says what one key holds; what
 * several keys say together, and whether a named device or file exists, only the reader can tell.
 */
public final class Schemas {
    private static final String DRAFT = "https://json-schema.org/draft/2020-12/schema";
    private static final String NUMBER = "(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d+)?";
    private static final String PREFIX = "[fpnuµμmkMGT]?";
    /** A digit other than zero before any exponent: the value is not zero. */
    private static final String NOT_ZERO = "(?=\\s*[+-]?[.0]*[1-9]|\\s*[A-Za-zµμ]0*[1-9]|\\s*0*[A-Za-zµμ]0*[1-9])";

    private Schemas() {}

    /** The schema of scenario files, as text. */
    public static String scenario() {
        return text("Hissledger scenario: one design question", object(ScenarioShapes.ScenarioKeys.SHAPE));
    }

    /** The schema of device files, as text. */
    public static String device() {
        Map<String, Shape> shapes = new LinkedHashMap<>();
        DeviceShapes.KINDS.forEach((kind, ofKind) -> shapes.put(kind.label(), ofKind.shape()));
        return text("Hissledger device: an active device with the basis of each value", kind(shapes));
    }

    private static String text(String title, Map<String, Object> schema) {
        Map<String, Object> whole = new LinkedHashMap<>();
        whole.put("$schema", DRAFT);
        whole.put("title", title);
        whole.putAll(schema);
        return JsonOut.text(whole);
    }

    /** An object of a shape. */
    static Map<String, Object> object(Shape shape) {
        return object(shape, properties(shape));
    }

    private static Map<String, Object> properties(Shape shape) {
        Map<String, Object> properties = new LinkedHashMap<>();
        for (Key<?> key : shape.keys()) {
            Map<String, Object> property = new LinkedHashMap<>();
            property.put("description", key.description());
            property.putAll(key.value().schema().get());
            properties.put(key.name(), property);
        }
        return properties;
    }

    private static Map<String, Object> object(Shape shape, Map<String, Object> properties) {
        List<String> required =
                shape.keys().stream().filter(Key::required).map(Key::name).toList();
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "object");
        schema.put("properties", properties);
        if (!required.isEmpty()) {
            schema.put("required", required);
        }
        schema.put("additionalProperties", false);
        return schema;
    }

    /** An object whose shape its kind chooses. */
    static Map<String, Object> kind(Map<String, Shape> shapes) {
        List<Object> forms = new ArrayList<>();
        shapes.forEach((word, shape) -> {
            Map<String, Object> properties = properties(shape);
            properties.put("kind", Map.of("const", word));
            Map<String, Object> form = new LinkedHashMap<>();
            form.put("title", shape.words());
            form.putAll(object(shape, properties));
            forms.add(form);
        });
        return Map.of("oneOf", forms);
    }

    /** Any of several forms. */
    static Map<String, Object> anyOf(Value<?>... forms) {
        List<Object> schemas = new ArrayList<>();
        for (Value<?> form : forms) {
            schemas.add(form.schema().get());
        }
        return Map.of("anyOf", schemas);
    }

    /** A list. */
    static Map<String, Object> list(Map<String, Object> item, int least) {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "array");
        schema.put("minItems", least);
        schema.put("items", item);
        return schema;
    }

    /** A text that is not blank. */
    static Map<String, Object> text() {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "string");
        schema.put("pattern", "\\S");
        return schema;
    }

    /** True or false. */
    static Map<String, Object> flag() {
        return Map.of("type", "boolean");
    }

    /** One word out of a list. */
    static Map<String, Object> word(List<String> words) {
        return Map.of("enum", words);
    }

    /** A number without dimension. */
    static Map<String, Object> number(Range range) {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "number");
        if (!Double.isInfinite(range.least())) {
            schema.put(range.leastAllowed() ? "minimum" : "exclusiveMinimum", range.least());
        }
        if (!Double.isInfinite(range.greatest())) {
            schema.put("maximum", range.greatest());
        }
        return schema;
    }

    /** A whole number. */
    static Map<String, Object> whole(int least, int greatest) {
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "integer");
        schema.put("minimum", least);
        schema.put("maximum", greatest);
        return schema;
    }

    /**
     * A physical value with its unit. Its sign and whether it may be zero are part of the pattern; an upper bound is not, the
     * reader holds that.
     */
    static Map<String, Object> quantity(Dimension dimension, Range range) {
        List<String> celsius = new ArrayList<>();
        List<String> plain = new ArrayList<>();
        List<String> prefixed = new ArrayList<>();
        List<String> levels = new ArrayList<>();
        for (String spelling : dimension.spellings()) {
            String escaped = spelling.replaceAll("([()/.])", "\\\\$1");
            if (spelling.equals("degC") || spelling.equals("°C")) {
                celsius.add(escaped);
            } else if (spelling.startsWith("dB")) {
                levels.add(escaped);
            } else if (Quantities.takesNoPrefix(spelling)) {
                plain.add(escaped);
            } else {
                prefixed.add(escaped);
            }
        }
        boolean signed = range.least() < 0.0;
        String sign = signed ? "[+-]?" : "\\+?";
        String notZero = range.least() > 0.0 || (!signed && !range.leastAllowed()) ? NOT_ZERO : "";
        List<String> units = new ArrayList<>(plain);
        if (!prefixed.isEmpty()) {
            units.add(PREFIX + "(?:" + String.join("|", prefixed) + ")");
        }
        List<String> forms = new ArrayList<>();
        if (!units.isEmpty()) {
            forms.add(notZero + "\\s*" + sign + NUMBER + "\\s*(?:" + String.join("|", units) + ")\\s*");
        }
        for (List<String> signedUnits : List.of(levels, celsius)) {
            if (!signedUnits.isEmpty()) {
                forms.add("\\s*[+-]?" + NUMBER + "\\s*(?:" + String.join("|", signedUnits) + ")\\s*");
            }
        }
        if (dimension.hasLetterCode()) {
            String letters = "["
                    + String.join(
                            "", new TreeSet<>(Quantities.letters(dimension).keySet())) + "]";
            forms.add(notZero + "\\s*(?:\\d+" + letters + "\\d*|" + letters + "\\d+)\\s*");
        }
        Map<String, Object> schema = new LinkedHashMap<>();
        schema.put("type", "string");
        schema.put("pattern", "^(?:" + String.join("|", forms) + ")$");
        schema.put("examples", List.of(dimension.example()));
        return schema;
    }
}
