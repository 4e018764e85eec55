/** The records of result.json, the only thing a report is made from. */
@NullMarked
package evensun.result;

import org.jspecify.annotations.NullMarked;
