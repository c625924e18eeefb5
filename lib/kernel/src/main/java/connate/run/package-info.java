/**
 * How is a workbook run? {@link connate.run.Replay} runs one from top to bottom in an engine
 * process of its own and tells a {@link connate.run.ReplayWatcher} all that happens. Read those two
 * first.
 */
package connate.run;
