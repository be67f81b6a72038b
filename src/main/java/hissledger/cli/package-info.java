/**
 * The verbs: arguments in, words and files out, exit codes. Nothing is computed here.
 */
@NullMarked
package hissledger.cli;

import org.jspecify.annotations.NullMarked;
