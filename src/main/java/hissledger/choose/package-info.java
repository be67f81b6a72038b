/**
 * What is asked and what is left open: scenarios and candidates, the search for the best current, the comparison of
 * candidates and the source resistance at which they change places.
 */
@NullMarked
package hissledger.choose;

import org.jspecify.annotations.NullMarked;
