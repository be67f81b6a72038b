package hissledger.files;

import static hissledger.Trials.forAll;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.json.JsonReadFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.random.RandomGenerator;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The generated schemas against a general-purpose schema library and against the reader itself. */
class SchemasTest {
    private static final JsonMapper MAPPER = JsonMapper.builder()
            .enable(JsonReadFeature.ALLOW_JAVA_COMMENTS)
            .enable(JsonReadFeature.ALLOW_TRAILING_COMMA)
            .build();
    private static final SchemaRegistry REGISTRY =
            SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
    private static final Schema SCENARIO = REGISTRY.getSchema(Schemas.scenario());
    private static final Schema DEVICE = REGISTRY.getSchema(Schemas.device());
    private static final int MUTATIONS = 600;

    @TempDir
    private Path folder = Path.of("");

    private static List<Path> files(String where) throws IOException {
        try (Stream<Path> files = Files.list(Path.of(where))) {
            return files.filter(file -> file.toString().endsWith(".json"))
                    .sorted()
                    .toList();
        }
    }

    private static boolean accepts(Schema schema, JsonNode tree) {
        return schema.validate(tree).isEmpty();
    }

    @Test
    void theShippedSchemasAreWhatTheReaderSays() throws IOException {
        String again = "; write it again with: hissledger schema scenario|device --out FILE";
        Path shipped = Path.of("src/main/resources/hissledger/schema");
        assertThat(Files.readString(shipped.resolve("scenario.schema.json")))
                .as("scenario.schema.json" + again)
                .isEqualTo(Schemas.scenario());
        assertThat(Files.readString(shipped.resolve("device.schema.json")))
                .as("device.schema.json" + again)
                .isEqualTo(Schemas.device());
    }

    @Test
    void everyShippedFileIsAccepted() throws IOException {
        for (Path file : files("scenarios")) {
            JsonNode tree = MAPPER.readTree(file.toFile());
            assertThat(SCENARIO.validate(tree)).as(file.toString()).isEmpty();
            assertThat(Files.exists(file.resolveSibling(tree.get("$schema").asText())))
                    .isTrue();
        }
        for (Path file : files("device-params")) {
            JsonNode tree = MAPPER.readTree(file.toFile());
            assertThat(DEVICE.validate(tree)).as(file.toString()).isEmpty();
            assertThat(Files.exists(file.resolveSibling(tree.get("$schema").asText())))
                    .isTrue();
        }
    }

    @Test
    void theStartersAreAcceptedByBoth() throws IOException, InputException {
        Path scenario = folder.resolve("mine.json");
        Starters.scenario(scenario);
        assertThat(accepts(SCENARIO, MAPPER.readTree(scenario.toFile()))).isTrue();
        assertThat(ScenarioReader.read(scenario, Catalogue.load(List.of())).candidates())
                .hasSize(2);
        Path device = folder.resolve("part-of-mine.json");
        Starters.device(device);
        assertThat(accepts(DEVICE, MAPPER.readTree(device.toFile()))).isTrue();
        assertThat(DeviceReader.read(device).id()).isEqualTo("part-of-mine");
    }

    @Test
    void everyKeyIsDescribed() throws IOException {
        for (String text : List.of(Schemas.scenario(), Schemas.device())) {
            described(MAPPER.readTree(text));
        }
    }

    private static void described(JsonNode node) {
        JsonNode properties = node.get("properties");
        if (properties != null) {
            properties
                    .properties()
                    .forEach(property -> assertThat(property.getValue().has("description")
                                    || property.getValue().has("const"))
                            .as(property.getKey())
                            .isTrue());
        }
        node.forEach(SchemasTest::described);
    }

    /**
     * Files with one mistake: whatever the schema refuses the reader refuses, and whatever the reader refuses of a single key
     * the schema refuses. (What several keys say together, and names of devices and files, only the reader can judge.)
     */
    @Test
    void schemaAndReaderAgreeOnMutatedScenarios() throws IOException {
        List<Path> files = files("scenarios");
        Files.copy(Path.of("scenarios/measured-source.csv"), folder.resolve("measured-source.csv"));
        int[] refused = new int[1];
        forAll(MUTATIONS, random -> {
            JsonNode tree = tree(files.get(random.nextInt(files.size())));
            String what = mutate(tree, random);
            String text = tree.toString();
            boolean bySchema = accepts(SCENARIO, tree);
            Faults faults = new Faults("mutated.json");
            shapes(ScenarioShapes.ScenarioKeys.SHAPE, text, faults);
            if (!faults.isEmpty()) {
                assertThat(bySchema)
                        .as("the schema accepts what the reader refuses: " + what)
                        .isFalse();
            }
            if (!bySchema) {
                refused[0]++;
                assertThat(readsScenario(text))
                        .as("the reader accepts what the schema refuses: " + what)
                        .isFalse();
            }
        });
        assertThat(refused[0]).as("mutations that were mistakes").isGreaterThan(MUTATIONS / 2);
    }

    @Test
    void schemaAndReaderAgreeOnMutatedDevices() throws IOException {
        List<Path> files = files("device-params");
        int[] refused = new int[1];
        forAll(MUTATIONS, random -> {
            Path file = files.get(random.nextInt(files.size()));
            JsonNode tree = tree(file);
            String what = mutate(tree, random);
            boolean bySchema = accepts(DEVICE, tree);
            if (!bySchema) {
                refused[0]++;
                assertThat(readsDevice(file, tree.toString()))
                        .as("the reader accepts what the schema refuses: " + file + " " + what)
                        .isFalse();
            }
        });
        assertThat(refused[0]).as("mutations that were mistakes").isGreaterThan(MUTATIONS / 2);
    }

    private static JsonNode tree(Path file) {
        try {
            return MAPPER.readTree(file.toFile());
        } catch (IOException broken) {
            throw new IllegalStateException(broken);
        }
    }

    private static void shapes(Shape shape, String text, Faults faults) {
        try {
            Optional<Fields> read =
                    shape.read(JsonIn.tree("mutated.json", text.getBytes(StandardCharsets.UTF_8)), faults);
            assertThat(read.isPresent() || !faults.isEmpty()).isTrue();
        } catch (InputException broken) {
            throw new IllegalStateException(broken);
        }
    }

    private boolean readsScenario(String text) {
        Path file = folder.resolve("mutated.json");
        try {
            Files.writeString(file, text);
            ScenarioReader.read(file, Catalogue.load(List.of()));
            return true;
        } catch (InputException fault) {
            return false;
        } catch (IOException broken) {
            throw new IllegalStateException(broken);
        }
    }

    private static boolean readsDevice(Path file, String text) {
        try {
            DeviceReader.read(String.valueOf(file.getFileName()), text.getBytes(StandardCharsets.UTF_8));
            return true;
        } catch (InputException fault) {
            return false;
        }
    }

    /** Makes one change somewhere in the tree and says which. */
    private static String mutate(JsonNode tree, RandomGenerator random) {
        List<ObjectNode> objects = new ArrayList<>();
        collect(tree, objects);
        ObjectNode object = objects.get(random.nextInt(objects.size()));
        List<String> names = new ArrayList<>();
        object.fieldNames().forEachRemaining(names::add);
        if (names.isEmpty()) {
            object.put("surplus", 1);
            return "a key in an empty object";
        }
        String name = names.get(random.nextInt(names.size()));
        JsonNode before = object.get(name);
        switch (random.nextInt(9)) {
            case 0 -> object.remove(name);
            case 1 -> object.put(name + "s", 1);
            case 2 -> object.putNull(name);
            case 3 -> object.put(name, true);
            case 4 -> object.set(name, MAPPER.createArrayNode());
            case 5 -> object.put(name, before.isTextual() ? before.asText() + " furlong" : "7 furlong");
            case 6 -> object.put(name, before.isTextual() ? "-" + before.asText() : "-1");
            case 7 -> object.put(name, -3.5);
            default -> object.put(name, " ");
        }
        return name + ": " + before + " became " + object.get(name);
    }

    private static void collect(JsonNode node, List<ObjectNode> objects) {
        if (node instanceof ObjectNode object) {
            objects.add(object);
        }
        if (node instanceof ObjectNode || node instanceof ArrayNode) {
            node.forEach(child -> collect(child, objects));
        }
    }
}
