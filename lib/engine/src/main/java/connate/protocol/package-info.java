/**
 * What engine and kernel say to each other: which events a command gives, and in which form a value
 * crosses from one process to the other.
 *
 * <p>Read {@link connate.protocol.Event} first (what can happen while a command runs), then {@link
 * connate.protocol.Item} (what a value looks like once it is data). The package uses the JDK alone,
 * so the kernel needs no science on its class path.
 */
package connate.protocol;
