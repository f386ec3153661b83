/**
 * The commands: words of the command line in, one call into the domain, text out, exit code.
 */
package flowshy.cli;
