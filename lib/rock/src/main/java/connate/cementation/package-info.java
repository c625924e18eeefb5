/**
 * What became of the pore space as the rock was buried and heated?
 *
 * <p>Read {@link connate.cementation.BurialModel} first: a {@link
 * connate.cementation.BurialHistory} drives compaction and quartz cement of a {@link
 * connate.cementation.Sandstone} step by step to porosity and permeability through time. {@link
 * connate.cementation.Walderhaug} is the law of quartz cement by itself, {@link
 * connate.cementation.CementedPermeability} what closing pores do to permeability, {@link
 * connate.cementation.PatchyCement} and {@link connate.cementation.Microporosity} are for other
 * cements and clay.
 */
package connate.cementation;
