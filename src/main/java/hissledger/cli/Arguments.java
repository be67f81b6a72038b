package hissledger.cli;

import hissledger.ledger.Figure;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.TypeConversionException;

/** Words on the command line that name something of the program's. */
final class Arguments {
    private Arguments() {}

    /** The constant that a word names. */
    static <T> T word(T[] constants, String word) {
        List<String> words = new ArrayList<>();
        for (T constant : constants) {
            if (constant.toString().equals(word)) {
                return constant;
            }
            words.add(constant.toString());
        }
        throw new TypeConversionException("must be " + String.join(" or ", words) + ", was '" + word + "'");
    }

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
