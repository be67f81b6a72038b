package hissledger.cli;

import hissledger.files.InputException;
import hissledger.files.SafeWrite;
import hissledger.files.Schemas;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The JSON Schema of the files, for editors. */
@Command(
        name = "schema",
        mixinStandardHelpOptions = true,
        sortOptions = false,
        description = "The JSON Schema of a kind of file, with which an editor completes keys and explains them.",
        footer = {"", "Example:", "  hissledger schema scenario --out scenario.schema.json"})
final class SchemaVerb implements Callable<Integer> {
    @Parameters(paramLabel = "KIND", description = "scenario or device")
    private FileKind kind = FileKind.SCENARIO;

    @Option(names = "--out", paramLabel = "FILE", description = "where to write it; standard output if left out")
    private Optional<Path> out = Optional.empty();

    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Override
    public Integer call() throws InputException {
        String schema = kind == FileKind.SCENARIO ? Schemas.scenario() : Schemas.device();
        if (out.isPresent()) {
            SafeWrite.text(out.get(), schema);
        } else {
            spec.commandLine().getOut().print(schema);
        }
        return ExitCode.DONE;
    }
}
