/**
 * What a published method states of itself, and what the library has to say while it works.
 *
 * <p>Read {@link connate.method.MethodCard} first: equation, inputs with their ranges, source. A
 * {@link connate.method.Caution} is something the reader must know. {@link
 * connate.method.Listening} is where an engine hears of both; no method knows about logs.
 */
package connate.method;
