package hissledger.cli;

import hissledger.files.Fault;
import hissledger.files.InputException;
import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** Every fault ends here: one sentence for each, on the error stream, and an exit code. */
final class Faults {
    private Faults() {}

    /** A mistake on the command line: what is wrong, what comes near, where help is. */
    static int usage(ParameterException fault, String[] args) {
        CommandLine command = fault.getCommandLine();
        PrintWriter err = command.getErr();
        StringBuilder sentence = new StringBuilder("hissledger: ")
                .append(trimmed(Objects.requireNonNullElse(fault.getMessage(), "wrong arguments")));
        if (fault instanceof UnmatchedArgumentException unmatched) {
            List<String> near = nearest(unmatched);
            if (!near.isEmpty()) {
                sentence.append("; did you mean ")
                        .append(String.join(" or ", near))
                        .append('?');
            }
        }
        err.println(sentence);
        err.println("See: " + command.getCommandSpec().qualifiedName() + " --help");
        return ExitCode.INPUT;
    }

    private static String trimmed(String message) {
        String line = message.lines().findFirst().orElse(message);
        return line.endsWith(".") ? line.substring(0, line.length() - 1) : line;
    }

    private static List<String> nearest(UnmatchedArgumentException fault) {
        if (fault.getUnmatched().isEmpty()) {
            return List.of();
        }
        String given = fault.getUnmatched().get(0);
        CommandLine command = fault.getCommandLine();
        List<String> known = new ArrayList<>();
        if (given.startsWith("-")) {
            command.getCommandSpec().options().forEach(option -> known.addAll(List.of(option.names())));
        } else {
            known.addAll(command.getSubcommands().keySet());
        }
        return hissledger.files.Nearest.of(given, known);
    }

    /** A fault while a verb ran. */
    static int execution(Exception fault, CommandLine command) {
        PrintWriter err = command.getErr();
        if (fault instanceof InputException input) {
            for (Fault one : input.faults()) {
                err.println(one.sentence());
            }
            return ExitCode.INPUT;
        }
        return internal(fault, command);
    }

    /** A mistake of the program's own. */
    static int internal(Throwable fault, CommandLine command) {
        PrintWriter err = command.getErr();
        err.println("hissledger: internal fault: " + fault.getClass().getSimpleName()
                + (fault.getMessage() == null ? "" : ", " + fault.getMessage()) + place(fault)
                + ". This is a mistake in the program: please report it with the scenario and the devices it uses.");
        return ExitCode.INTERNAL;
    }

    private static String place(Throwable fault) {
        StackTraceElement[] trace = fault.getStackTrace();
        return trace.length == 0 ? "" : " (" + trace[0].getFileName() + ":" + trace[0].getLineNumber() + ")";
    }
}
