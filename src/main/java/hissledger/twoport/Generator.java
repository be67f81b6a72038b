package hissledger.twoport;

/** The identity of one independent noise generator. The chain carries it; it never looks inside. */
public interface Generator {
    /** The name under which the generator's contribution is entered, the same wherever it is shown. */
    String name();
}
