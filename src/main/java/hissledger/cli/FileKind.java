package hissledger.cli;

import java.util.Locale;

/** The two kinds of file that a user writes. */
enum FileKind {
    SCENARIO,
    DEVICE;

    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT);
    }
}
