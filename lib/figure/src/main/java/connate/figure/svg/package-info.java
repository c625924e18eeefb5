/**
 * How is a figure written so that a page can hold it inline? Read {@link
 * connate.figure.svg.SvgCanvas} first.
 *
 * <p>Text stays text; no font of the machine is read, so the bytes are the same everywhere. Styles
 * are presentation attributes of groups: a page's content policy may block {@code style=}.
 */
package connate.figure.svg;
