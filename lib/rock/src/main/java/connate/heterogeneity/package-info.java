/**
 * How unevenly permeability is spread: {@link connate.heterogeneity.DykstraParsons} and {@link
 * connate.heterogeneity.Lorenz} grade it, {@link connate.heterogeneity.Variation} tells how many
 * samples a mean needs.
 */
package connate.heterogeneity;
