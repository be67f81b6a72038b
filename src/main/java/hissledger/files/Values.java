package hissledger.files;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/** The kinds of value that the files hold. */
final class Values {
    private Values() {}

    /** A physical value with its unit. */
    static Value<Double> quantity(Dimension dimension, Range range) {
        return map(written(dimension, range), Quantities.Parsed::value);
    }

    /** A physical value whose unit decides what it means: a level in dBu or V, a sensitivity per Pa or per m/s. */
    static Value<Quantities.Parsed> written(Dimension dimension, Range range) {
        return new Value<>(() -> Schemas.quantity(dimension, range), (node, faults) -> {
            if (node.kind() == Node.Kind.NUMBER) {
                String first = dimension.example().substring(dimension.example().indexOf(' ') + 1);
                faults.at(
                        node,
                        "must be " + dimension.words() + " with its unit in quotes, was the bare number " + node.text()
                                + "; write it like \""
                                + (finite(node) ? node.text() + " " + first : dimension.example())
                                + "\"");
                return Optional.empty();
            }
            if (node.kind() != Node.Kind.TEXT) {
                return wrong(node, faults, dimension.words() + " in quotes, like \"" + dimension.example() + "\"");
            }
            try {
                Quantities.Parsed parsed = Quantities.parse(node.text(), dimension);
                boolean level = parsed.unit().startsWith("dB");
                if (level ? Double.isFinite(parsed.value()) : range.accepts(parsed.value())) {
                    return Optional.of(parsed);
                }
                faults.at(node, "must be " + range.words(dimension.printed()) + ", was " + node.quoted());
            } catch (Quantities.NotAQuantity fault) {
                faults.at(node, fault.why());
            }
            return Optional.empty();
        });
    }

    /** A number without dimension. */
    static Value<Double> number(Range range) {
        return new Value<>(() -> Schemas.number(range), (node, faults) -> {
            if (node.kind() != Node.Kind.NUMBER) {
                return wrong(node, faults, "a plain number without unit and quotes");
            }
            double value = value(node);
            if (!range.accepts(value)) {
                faults.at(node, "must be " + range.words("") + ", was " + node.text());
                return Optional.empty();
            }
            return Optional.of(value);
        });
    }

    /** A whole number. */
    static Value<Integer> whole(int least, int greatest) {
        return new Value<>(() -> Schemas.whole(least, greatest), (node, faults) -> {
            String wanted = "a whole number from " + least + " to " + greatest;
            if (node.kind() != Node.Kind.NUMBER) {
                return wrong(node, faults, wanted);
            }
            double value = value(node);
            if (value != Math.rint(value) || value < least || value > greatest) {
                faults.at(node, "must be " + wanted + ", was " + node.text());
                return Optional.empty();
            }
            return Optional.of((int) value);
        });
    }

    /** A text that is not blank. */
    static Value<String> text() {
        return new Value<>(Schemas::text, (node, faults) -> {
            if (node.kind() != Node.Kind.TEXT) {
                return wrong(node, faults, "a text in quotes");
            }
            if (node.text().isBlank()) {
                faults.at(node, "must not be empty");
                return Optional.empty();
            }
            return Optional.of(node.text());
        });
    }

    /** True or false. */
    static Value<Boolean> flag() {
        return new Value<>(
                Schemas::flag,
                (node, faults) -> node.kind() == Node.Kind.FLAG
                        ? Optional.of(Boolean.valueOf(node.text()))
                        : wrong(node, faults, "true or false, without quotes"));
    }

    /** One word out of a list. */
    static <T> Value<T> word(List<T> choices, Function<T, String> label) {
        Map<String, T> byWord = new LinkedHashMap<>();
        choices.forEach(choice -> byWord.put(label.apply(choice), choice));
        List<String> words = List.copyOf(byWord.keySet());
        return new Value<>(() -> Schemas.word(words), (node, faults) -> {
            if (node.kind() != Node.Kind.TEXT) {
                return wrong(node, faults, "one of " + String.join(", ", words) + ", in quotes");
            }
            Optional<T> chosen = Optional.ofNullable(byWord.get(node.text()));
            if (chosen.isEmpty()) {
                faults.at(
                        node,
                        "must be one of " + String.join(", ", words) + ", was " + node.quoted()
                                + meant(node.text(), words));
            }
            return chosen;
        });
    }

    /** A list of values. */
    static <T> Value<List<Located<T>>> list(Value<T> item, int least) {
        return new Value<>(() -> Schemas.list(item.schema().get(), least), (node, faults) -> {
            if (node.kind() != Node.Kind.LIST) {
                return wrong(node, faults, "a list [ ]");
            }
            if (node.items().size() < least) {
                faults.at(node, "must hold at least " + least + (least == 1 ? " item" : " items"));
                return Optional.empty();
            }
            List<Located<T>> items = new ArrayList<>();
            for (Node each : node.items()) {
                item.read(each, faults).ifPresent(value -> items.add(new Located<>(each, value)));
            }
            return Optional.of(items);
        });
    }

    /** An object of a shape. */
    static Value<Fields> object(Shape shape) {
        return new Value<>(() -> Schemas.object(shape), shape::read);
    }

    /** An object whose shape its {@code kind} chooses. */
    static Value<Fields> kind(Map<String, Shape> shapes) {
        List<String> kinds = List.copyOf(shapes.keySet());
        return new Value<>(() -> Schemas.kind(shapes), (node, faults) -> {
            if (node.kind() != Node.Kind.OBJECT) {
                return wrong(node, faults, "an object { } with a kind");
            }
            Optional<Node> kind = node.member("kind");
            if (kind.isEmpty()) {
                faults.at(node, "has no kind; it must be one of " + String.join(", ", kinds));
                return Optional.empty();
            }
            Shape shape =
                    kind.get().kind() == Node.Kind.TEXT ? shapes.get(kind.get().text()) : null;
            if (shape == null) {
                faults.at(
                        kind.get(),
                        "must be one of " + String.join(", ", kinds) + ", was "
                                + kind.get().quoted() + meant(kind.get().text(), kinds));
                return Optional.empty();
            }
            return shape.read(node, faults);
        });
    }

    /** A value whose form is decided when other keys are known; it is handed on as it stands. */
    static Value<Node> undecided(Value<?>... forms) {
        return new Value<>(() -> Schemas.anyOf(forms), (node, faults) -> Optional.of(node));
    }

    /** A value turned into another once it has been read. */
    static <S, T> Value<T> map(Value<S> value, Function<S, T> turn) {
        return new Value<>(
                value.schema(), (node, faults) -> value.read(node, faults).map(turn));
    }

    /** The number of a node; the words for what is none are read too, so that they can be refused by their names. */
    private static double value(Node node) {
        return Double.parseDouble(node.text().replace("INF", "Infinity"));
    }

    private static boolean finite(Node node) {
        return Double.isFinite(value(node));
    }

    private static <T> Optional<T> wrong(Node node, Faults faults, String wanted) {
        faults.at(node, "must be " + wanted + ", was " + node.quoted());
        return Optional.empty();
    }

    private static String meant(String given, List<String> known) {
        List<String> near = Nearest.of(given, known);
        return near.isEmpty() ? "" : "; did you mean \"" + near.get(0) + "\"?";
    }
}
