/**
 * The one table of the keys that a study may hold. It drives the reader, the list of keys, the JSON Schema for editors and
 * the suggestions for mistyped keys. Knows no hair and no medium: that is left to the study's reader.
 */
package flowshy.study.keys;
