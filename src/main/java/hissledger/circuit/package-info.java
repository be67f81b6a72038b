/**
 * Front ends: source, path elements, arrangements of the active stage, operating point, headroom. Printing never lives
 * here.
 */
@NullMarked
package hissledger.circuit;

import org.jspecify.annotations.NullMarked;
