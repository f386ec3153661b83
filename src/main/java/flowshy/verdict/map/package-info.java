/**
 * A figure of a device over two numbers of its study: values on a grid, what makes no device there, and lines of equal value. Which numbers
 * and which figure is left to the caller.
 */
package flowshy.verdict.map;
