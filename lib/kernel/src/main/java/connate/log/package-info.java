/**
 * What a replay leaves behind: one self-contained HTML file that a colleague can check line by
 * line.
 *
 * <p>{@link connate.record.ReplayLog} collects what happens, {@link connate.log.LogPage} writes it.
 * {@link connate.log.Markup} is the one place where text becomes HTML, {@link connate.log.SvgGate}
 * the one through which figures pass.
 */
package connate.log;
