/**
 * Figures as pictures in a terminal that can show them: {@link connate.picture.PictureTerminal}
 * knows which can and how, {@link connate.picture.Raster} turns a figure into dots.
 */
package connate.picture;
