/**
 * How sure a result is: distributions, draws, samples, and which input matters.
 *
 * <p>Read {@link connate.chance.Simulation} first: it runs a calculation many times with inputs
 * drawn from {@link connate.chance.Distribution}s and gives {@link connate.chance.Runs}, whose
 * {@link connate.chance.Sample}s tell what is exceeded by 90, 50 and 10 percent of the runs.
 */
package connate.chance;
