/**
 * What is asked and what is left open: scenarios and candidates, the search for the best current, the comparison of
 * candidates, the source resistance at which they change places, and who is quietest over resistance and frequency.
 */
@NullMarked
package hissledger.choose;

import org.jspecify.annotations.NullMarked;
