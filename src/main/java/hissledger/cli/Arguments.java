package hissledger.cli;

import hissledger.ledger.Figure;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;

/** Words on the command line that name something of the program's. */
final class Arguments {
    private Arguments() {}

    /** The figure that a word names. */
    static Figure figure(CommandSpec spec, String word) {
        return Figure.ofKey(word).orElseThrow(() -> {
            List<String> keys = new ArrayList<>();
            for (Figure figure : Figure.values()) {
                keys.add(figure.key());
            }
            return new ParameterException(
                    spec.commandLine(), "--by '" + word + "' is no figure; use one of " + String.join(", ", keys));
        });
    }
}
