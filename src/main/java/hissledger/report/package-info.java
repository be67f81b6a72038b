/**
 * Results in words and numbers: text tables, CSV, JSON. Nothing is computed here.
 */
@NullMarked
package hissledger.report;

import org.jspecify.annotations.NullMarked;
