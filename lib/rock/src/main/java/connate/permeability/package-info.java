/**
 * How permeability follows from what is easier to have: porosity, grains, pore throats, saturation.
 * Read {@link connate.permeability.KozenyCarman} as the pattern.
 */
package connate.permeability;
