package flowshy.verdict;

/**
 * One interval of frequency and what the device reads in it.
 *
 * @param from lower end [Hz]
 * @param to upper end [Hz]
 * @param reads what it reads
 * @param rejectionFrom rejection at the lower end [dB], infinite or NaN where undefined
 * @param rejectionTo rejection at the upper end [dB]
 */
public record ReadingBand(double from, double to, Reads reads, double rejectionFrom, double rejectionTo) {}
