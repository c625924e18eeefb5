/**
 * Flow through rock by Darcy's law: along a core, to a well. Read {@link connate.darcy.Darcy}
 * first.
 */
package connate.darcy;
