package hissledger.cli;

import hissledger.choose.ESeries;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** Entry point of the command line. */
@Command(
        name = "hissledger",
        version = "hissledger 0.1.0",
        mixinStandardHelpOptions = true,
        description = "Which input device, how many, at what current, in what circuit, and what the hiss will be.",
        synopsisSubcommandLabel = "VERB",
        subcommands = {
            LedgerVerb.class,
            CompareVerb.class,
            OptimumVerb.class,
            RegionsVerb.class,
            BiasVerb.class,
            DevicesVerb.class,
            NewVerb.class,
            SchemaVerb.class
        },
        footer = {
            "",
            "Example:",
            "  hissledger compare scenarios/vocal-dynamic.json --chart vocal.png",
            "",
            "Exit codes: 0 done, 1 target missed (with --check), 2 wrong input, 3 internal fault."
        })
public final class Main implements Runnable {
    @Spec
    private CommandSpec spec = CommandSpec.create();

    /** Runs the program and ends the process with its exit code. */
    public static void main(String[] args) {
        System.setProperty("java.awt.headless", "true");
        PrintWriter out = new PrintWriter(System.out, true, StandardCharsets.UTF_8);
        PrintWriter err = new PrintWriter(System.err, true, StandardCharsets.UTF_8);
        System.exit(run(out, err, args));
    }

    /** Runs the program with its output going to the given writers, and returns the exit code. */
    static int run(PrintWriter out, PrintWriter err, String... args) {
        CommandLine commandLine = new CommandLine(new Main());
        commandLine.setOut(out);
        commandLine.setErr(err);
        commandLine.setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF));
        commandLine.registerConverter(FileKind.class, word -> Arguments.word(FileKind.values(), word));
        commandLine.registerConverter(
                CompareVerb.ChartKind.class, word -> Arguments.word(CompareVerb.ChartKind.values(), word));
        commandLine.registerConverter(RegionsVerb.Kind.class, word -> Arguments.word(RegionsVerb.Kind.values(), word));
        commandLine.registerConverter(ESeries.class, word -> Arguments.word(BiasVerb.RESISTORS, word));
        commandLine.setParameterExceptionHandler(Faults::usage);
        commandLine.setExecutionExceptionHandler((fault, command, parsed) -> Faults.execution(fault, command));
        int code;
        try {
            code = commandLine.execute(args);
        } catch (StackOverflowError | OutOfMemoryError | LinkageError fault) {
            code = Faults.internal(fault, commandLine);
        }
        out.flush();
        err.flush();
        return code;
    }

    @Override
    public void run() {
        throw new ParameterException(spec.commandLine(), "no verb given");
    }
}
