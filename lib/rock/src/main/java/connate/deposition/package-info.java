/**
 * How porous was the sand when it was laid down?
 *
 * <p>Read {@link connate.deposition.BeardWeyl} first: measured porosity and permeability of packed
 * sand by size and sorting. {@link connate.deposition.SchererInitial} and {@link
 * connate.deposition.VukovicSoro} give porosity from sorting alone, {@link
 * connate.deposition.SpherePacking} its bounds for equal spheres, {@link
 * connate.deposition.BimodalMixture} what fines do between coarse grains.
 */
package connate.deposition;
