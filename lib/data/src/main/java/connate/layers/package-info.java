/**
 * What a well log comes to layer by layer: net and gross by cutoffs, porosity-thickness, kh, k
 * along and across, with the range between wells. Read {@link connate.layers.Layers} first.
 */
package connate.layers;
