/**
 * How large are the grains, and how well are they sorted?
 *
 * <p>Read {@link connate.grains.GrainCurve} first: a sieve or laser analysis as a cumulative curve
 * that gives percentiles; {@link connate.grains.GrainCurves} is many of them from a table. On top
 * stand the published statistics: {@link connate.grains.FolkWard}, {@link
 * connate.grains.GrainMoments}, {@link connate.grains.Trask}, {@link connate.grains.Uniformity} and
 * {@link connate.grains.EffectiveDiameter}.
 */
package connate.grains;
