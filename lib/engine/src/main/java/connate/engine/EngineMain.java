package connate.engine;

import connate.protocol.Channel;
import connate.protocol.Event;
import connate.protocol.Reply;
import connate.protocol.Request;
import java.io.FileDescriptor;
import java.io.FileInputStream;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;

/**
 * The engine process: takes requests from its standard input and sends replies to its standard
 * output, which the user's commands never see.
 */
public final class EngineMain {

  private final Channel channel;
  private final Teller teller;
  private final Session session;
  private final BlockingQueue<Request> requests = new LinkedBlockingQueue<>();
  private final Thread runner;

  private EngineMain() {
    channel =
        new Channel(
            new FileInputStream(FileDescriptor.in), new FileOutputStream(FileDescriptor.out));
    teller = new Teller(channel);
    session = new Session(teller);
    runner = new Thread(null, this::work, "commands", 16L << 20);
  }

  /** Starts the engine; it ends when its standard input does. */
  public static void main(String[] args) throws IOException {
    Interrupts.ignore();
    new EngineMain().serve();
  }

  private void serve() throws IOException {
    System.setIn(InputStream.nullInputStream());
    runner.setDaemon(true);
    runner.start();
    channel.send(new Reply.Ready(Channel.VERSION));
    Runtime.getRuntime().addShutdownHook(new Thread(this::tellExit));
    Warmth.gather();
    Optional<Request> request = channel.request();
    while (request.isPresent() && !(request.get() instanceof Request.Close)) {
      if (request.get() instanceof Request.Stop stop) {
        stop(stop.command());
      } else {
        requests.add(request.get());
      }
      request = channel.request();
    }
    Runtime.getRuntime().halt(0);
  }

  private void work() {
    session.serve();
    while (true) {
      try {
        perform(requests.take());
      } catch (InterruptedException e) {
        // a stop that came too late for its command
        continue;
      }
    }
  }

  private void perform(Request request) {
    if (request instanceof Request.Begin begin) {
      session.begin(begin);
    } else if (request instanceof Request.Load load) {
      session.load(load);
    } else if (request instanceof Request.Invoke invoke) {
      session.invoke(invoke);
    } else if (request instanceof Request.Read read) {
      session.read(read);
    }
  }

  private void stop(int command) {
    teller.stop(
        command,
        () -> {
          Checkpoint.want(true);
          runner.interrupt();
        });
  }

  /** A command ended its own process; the kernel learns that it was no crash. */
  private void tellExit() {
    session.endPrinting();
    teller.tell(new Event.Failed("exit", "", "", List.of(), false));
  }
}
