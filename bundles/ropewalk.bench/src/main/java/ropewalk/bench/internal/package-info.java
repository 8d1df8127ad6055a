/**
 * {@code ropewalk bench}: how fast this machine measures, on data that it makes itself from fixed seeds. Nothing here is
 * exported.
 */
package ropewalk.bench.internal;
