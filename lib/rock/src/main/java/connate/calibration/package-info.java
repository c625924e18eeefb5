/**
 * How a transform is fitted to core, and how well it holds: fits with their errors, back-transform
 * of logarithms, comparison of candidates, rock types.
 *
 * <p>Read {@link connate.calibration.LogLinear} and {@link connate.calibration.TransformFit} first,
 * then {@link connate.calibration.Transforms} for the comparison. {@link
 * connate.calibration.LeastSquares} is the regression under all of them.
 */
package connate.calibration;
