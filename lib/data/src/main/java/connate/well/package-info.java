/**
 * What is known of a well along its depth? {@link connate.well.Well} holds logs as series with
 * units over one depth; {@link connate.well.Wells} are several of them. Read {@code Well} first,
 * then {@link connate.well.Tops} (zones from a table of tops), {@link connate.well.Survey}
 * (vertical depth) and {@link connate.well.CoreShift} (core against log).
 *
 * <p>Nothing here needs a table: a path that reads only logs loads no table library.
 */
package connate.well;
