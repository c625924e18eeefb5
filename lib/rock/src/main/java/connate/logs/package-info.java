/**
 * What well logs say of the rock: porosity from density and sonic, shale volume from gamma ray,
 * water saturation. Read {@link connate.logs.DensityPorosity} as the pattern.
 */
package connate.logs;
