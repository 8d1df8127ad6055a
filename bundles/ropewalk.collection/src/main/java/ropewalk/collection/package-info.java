/**
 * Collections in, results out: comma-separated files (RFC 4180, Y. Shafranovich, 2005) in UTF-8 (RFC 3629, F. Yergeau, 2003).
 *
 * <p>{@link ropewalk.collection.CollectionReader} reads a collection as a stream of
 * {@link ropewalk.collection.RecordBlock}s: flat arrays, no object per field. A bad row costs itself only and comes out as a
 * {@link ropewalk.collection.Rejection} that knows its place among the good ones. {@link ropewalk.collection.CsvRows} writes
 * rows; what was read comes back byte for byte in the value of its field.
 *
 * <p>Lines and columns are counted as a text editor does: the first line of a file is 1, the first character of a row is
 * column 1, and a character is one Unicode code point. LF, CR LF and a CR alone each end one line.
 */
@org.osgi.annotation.bundle.Export
@org.osgi.annotation.versioning.Version("1.0.0")
package ropewalk.collection;
