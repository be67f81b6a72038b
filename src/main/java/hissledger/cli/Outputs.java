package hissledger.cli;

import hissledger.files.InputException;
import hissledger.files.JsonOut;
import hissledger.files.SafeWrite;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** Where results go beside the text: {@code -} means standard output, in place of the text. */
final class Outputs {
    private static final String STANDARD_OUTPUT = "-";

    @Option(names = "--json", paramLabel = "FILE", description = "write the result as JSON; - for standard output")
    private Optional<String> json = Optional.empty();

    @Option(names = "--csv", paramLabel = "FILE", description = "write the table as CSV; - for standard output")
    private Optional<String> csv = Optional.empty();

    @Spec(Spec.Target.MIXEE)
    private CommandSpec spec = CommandSpec.create();

    /** Refuses two results in one place, before anything is computed. */
    void check() {
        if (json.isPresent() && json.equals(csv)) {
            throw new ParameterException(
                    spec.commandLine(),
                    json.get().equals(STANDARD_OUTPUT)
                            ? "standard output takes one of --json and --csv; give the other a file"
                            : "--json and --csv name the same file, " + json.get() + "; give each its own");
        }
    }

    /** Writes what was asked for: files first, then the text unless standard output carries data. */
    void write(PrintWriter out, String text, Supplier<Map<String, Object>> tree, Supplier<String> table)
            throws InputException {
        boolean data = false;
        if (json.isPresent()) {
            data |= write(out, json.get(), JsonOut.text(tree.get()));
        }
        if (csv.isPresent()) {
            data |= write(out, csv.get(), table.get());
        }
        if (!data) {
            out.print(text);
            out.flush();
        }
    }

    private static boolean write(PrintWriter out, String target, String content) throws InputException {
        if (target.equals(STANDARD_OUTPUT)) {
            out.print(content);
            out.flush();
            return true;
        }
        SafeWrite.text(Path.of(target), content);
        return false;
    }
}
