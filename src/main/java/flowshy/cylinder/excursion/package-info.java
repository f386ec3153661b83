/**
 * Cylinders in streams that carry the medium far against the radius: one operating point, the resistance that every source then
 * meets, and the regime of each strip. Leaves the streams themselves to {@code stream}.
 */
package flowshy.cylinder.excursion;
