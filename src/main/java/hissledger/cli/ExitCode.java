package hissledger.cli;

/** What the program tells its caller. */
final class ExitCode {
    private ExitCode() {}

    /** Done. */
    static final int DONE = 0;

    /** The target in the scenario is missed (only where asked with --check). */
    static final int TARGET_MISSED = 1;

    /** The input is wrong. */
    static final int INPUT = 2;

    /** An internal fault. */
    static final int INTERNAL = 3;
}
