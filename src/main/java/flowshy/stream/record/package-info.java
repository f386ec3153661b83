/**
 * Measured spectra and records: one reader for columns of numbers in a text file, and Welch's method for records in time. Says where
 * in the file a fault is; leaves to {@code study} how a user names the file.
 */
package flowshy.stream.record;
