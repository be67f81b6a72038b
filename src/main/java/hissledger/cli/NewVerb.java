package hissledger.cli;

import hissledger.files.InputException;
import hissledger.files.Starters;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** A commented file to start from. */
@Command(
        name = "new",
        mixinStandardHelpOptions = true,
        description = "Writes a commented file with sensible values to start from; never overwrites.",
        footer = {"", "Example:", "  hissledger new scenario my-microphone.json"})
final class NewVerb implements Callable<Integer> {
    @Parameters(index = "0", paramLabel = "KIND", description = "scenario or device")
    private FileKind kind = FileKind.SCENARIO;

    @Parameters(
            index = "1",
            paramLabel = "FILE",
            description = "the file to write; a device takes its id from the name")
    private Path file = Path.of("");

    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Override
    public Integer call() throws InputException {
        String next;
        if (kind == FileKind.SCENARIO) {
            Starters.scenario(file);
            next = "Try it: hissledger compare " + file;
        } else {
            Starters.device(file);
            next = "Check it: hissledger devices check " + file;
        }
        spec.commandLine().getOut().println("Wrote " + file + ". " + next);
        return ExitCode.DONE;
    }
}
