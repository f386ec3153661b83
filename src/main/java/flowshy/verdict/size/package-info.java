/**
 * Sizes a device: the numbers within their ranges that make a figure least or largest while every limit is kept, which limit binds, and, when
 * nothing fits, how near one can get. What the numbers and figures are is left to the caller.
 */
package flowshy.verdict.size;
