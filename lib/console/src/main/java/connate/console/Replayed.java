package connate.console;

import connate.log.LogPage;
import connate.log.RunFacts;
import connate.record.LogRecord;
import connate.record.ReplayLog;
import connate.run.Replay;
import connate.run.ReplayOutcome;
import connate.run.ReplaySettings;
import connate.workbook.Workbook;
import java.time.Duration;
import java.time.Instant;
import org.jline.utils.Signals;

/**
 * A replay that has ended, and its log.
 *
 * @param log what happened
 * @param page the log as HTML
 */
record Replayed(ReplayLog log, String page) {

  /**
   * Replays a workbook; Ctrl-C stops it, and what ran before is in the log.
   *
   * @param workbook the workbook
   * @param bytes its bytes, for the record
   * @param settings with what it runs
   * @param pack whether the input files go into the log
   * @param progress whether a terminal shows how far it is
   */
  static Replayed run(
      Workbook workbook, byte[] bytes, ReplaySettings settings, boolean pack, boolean progress) {
    Instant when = Instant.now();
    long start = System.nanoTime();
    ReplayLog log = new ReplayLog(workbook, settings);
    log.ended(run(workbook, settings, log, progress));
    LogRecord record = LogRecord.of(log, bytes, pack);
    Duration took = Duration.ofNanos(System.nanoTime() - start);
    return new Replayed(log, LogPage.of(log, record, new RunFacts(when, took, way(log.outcome()))));
  }

  private static ReplayOutcome run(
      Workbook workbook, ReplaySettings settings, ReplayLog log, boolean progress) {
    Replay replay =
        Replay.of(workbook, settings, new Progress(log, workbook.commands().size(), progress));
    Object before = Signals.register("INT", replay::stop);
    try {
      return replay.run();
    } finally {
      Signals.unregister("INT", before);
    }
  }

  private static String way(ReplayOutcome outcome) {
    String way = outcome.way() == ReplaySettings.Way.WHOLE ? "at once" : "command by command";
    return outcome.why().isEmpty() ? way : way + ": " + outcome.why();
  }
}
