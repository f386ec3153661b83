/** The states a device must bear: its verdict over all of them, and the worst one by name. */
package flowshy.verdict.envelope;
