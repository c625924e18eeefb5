/**
 * What many permeabilities come to as one: means along and across beds, bounds that hold for any
 * rock, and laws for media of known structure. Read {@link connate.averages.Averages} first.
 */
package connate.averages;
