/**
 * How Connate says that something is wrong with its input: {@link connate.fault.Fault} is one
 * finding with its place, {@link connate.fault.DataException} carries up to twenty of them, {@link
 * connate.fault.NoConvergence} tells of a computation that did not settle.
 */
package connate.fault;
