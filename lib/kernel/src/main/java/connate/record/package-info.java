/**
 * The machine-readable record that a log carries: {@link connate.record.LogRecord} writes it,
 * {@code RECORD.md} in {@code lib/kernel} documents its schema.
 */
package connate.record;
