/**
 * How does it look? Figures for the trade: crossplot, depth plot, histogram and their kin. Read
 * {@link connate.figure.Figures} first: each figure starts there.
 *
 * <p>A figure is a value: each call on it returns another one. It becomes SVG for a page or a
 * sketch in text for a terminal. Every axis bears quantity and unit; what could not be drawn is
 * counted beneath. Inside, each figure describes itself as a {@code Plot} of panels, axes and
 * layers; {@code PlotSvg} and {@code PlotSketch} draw that.
 */
package connate.figure;
