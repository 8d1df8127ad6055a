package ropewalk.collection.internal;

/** What can be wrong with the bytes of a row, whatever its fields mean. */
public enum Fault {
    /** Bytes that are no UTF-8. */
    NOT_UTF8,
    /** A NUL byte. */
    NUL,
    /** A closing quote followed by something else than a comma or the end of the row. */
    TEXT_AFTER_QUOTE,
    /** A quote inside a field that does not begin with one. */
    STRAY_QUOTE,
    /** A quoted field that does not end. */
    UNCLOSED_QUOTE,
    /** A quoted field that does not end within the longest row. */
    UNCLOSED_WITHIN_LIMIT,
    /** A row longer than the longest row. */
    TOO_LONG
}
