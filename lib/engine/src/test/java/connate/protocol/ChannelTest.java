package connate.protocol;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Checks that what is sent arrives, and that what nobody sent does no harm. All by hand. */
class ChannelTest {

  private static final Item.Measure MEASURE =
      new Item.Measure("permeability", 142, "mD", 96, 211, "80 %", 7, "142 mD (80 %: 96 to 211)");

  static Stream<Event> events() {
    Item.Grid grid =
        new Item.Grid(
            "caption",
            List.of(new Item.Head("well", "", false), new Item.Head("k", "mD", true)),
            List.of(List.of("TH-1", "3"), List.of("größe\n", "")),
            17,
            List.of("a note"));
    Item.Picture picture = new Item.Picture("<svg/>", "t", "d", List.of("n"), "sketch");
    return Stream.of(
        new Event.Shown(new Item.Text("µ \u0000 \ud83d\ude00")),
        new Event.Shown(new Item.Group(List.of(grid, picture, MEASURE))),
        new Event.Kept("k", MEASURE),
        new Event.Assumed("cutoff", MEASURE, MEASURE, true),
        new Event.Cautioned("T03", "file", "text", 12),
        new Event.Used("id", "title", "a = b", "source", "status", "range"),
        new Event.InputRead("a/b.csv", "/x/a/b.csv", 1L << 40, "ab12", 4711, List.of("k in mD")),
        new Event.Printed("line\n", true),
        new Event.Progress("reading", Double.NaN),
        new Event.Returned("v", "List<String>", null),
        new Event.Returned("", "", grid),
        new Event.Failed("exception", "E", "m", List.of(new Event.Frame("f", "w.jsh", 3)), true));
  }

  @ParameterizedTest
  @MethodSource("events")
  void eventsArrive(Event event) throws IOException {
    Reply.Told told = new Reply.Told(3, event);
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    new Channel(InputStream.nullInputStream(), bytes).send(told);
    Channel reader = over(bytes.toByteArray());
    assertEquals(Optional.of(told), reader.reply());
    assertEquals(Optional.empty(), reader.reply());
  }

  @Test
  void requestsArrive() throws IOException {
    List<Request> requests =
        List.of(
            new Request.Begin("w.jsh", "/a", "", Map.of("a", "1"), -3, true),
            new Request.Invoke(1, "C", "$1", "x", "int", false),
            new Request.Read("C", "x"),
            new Request.Stop(1),
            new Request.Close());
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    Channel writer = new Channel(InputStream.nullInputStream(), bytes);
    for (Request request : requests) {
      writer.send(request);
    }
    writer.send(new Request.Load(List.of(new Request.Bytecode("C", new byte[] {1, 2}))));
    Channel reader = over(bytes.toByteArray());
    for (Request request : requests) {
      assertEquals(Optional.of(request), reader.request());
    }
    Request.Load load = (Request.Load) reader.request().orElseThrow();
    assertArrayEquals(new byte[] {1, 2}, load.classes().get(0).bytes());
  }

  @Test
  void sizesAreNotBelieved() {
    for (int size : new int[] {-1, 0, Channel.LARGEST + 1, Integer.MAX_VALUE}) {
      byte[] frame = ByteBuffer.allocate(8).putInt(size).array();
      assertThrows(BadFrame.class, () -> over(frame).reply());
    }
    byte[] texts = ByteBuffer.allocate(13).putInt(9).put((byte) 3).putInt(1 << 30).array();
    assertThrows(BadFrame.class, () -> over(texts).reply());
  }

  @Test
  void groupsAreNotNestedWithoutEnd() {
    Item item = new Item.Text("x");
    for (int i = 0; i < 40; i++) {
      item = new Item.Group(List.of(item));
    }
    byte[] message = MessageCodec.bytes(new Reply.Told(1, new Event.Shown(item)));
    assertThrows(BadFrame.class, () -> MessageCodec.reply(message));
  }

  /** Every bit of a frame may be wrong: it is read as something else or refused, no more. */
  @Test
  void spoiltFramesAreRefusedInOrder() {
    Random random = new Random(20261201);
    int refused = 0;
    for (Event event : events().toList()) {
      byte[] sound = MessageCodec.bytes(new Reply.Told(3, event));
      for (int i = 0; i < 500; i++) {
        byte[] spoilt = sound.clone();
        spoilt[random.nextInt(spoilt.length)] = (byte) random.nextInt(256);
        byte[] cut = java.util.Arrays.copyOf(spoilt, random.nextInt(spoilt.length + 1));
        refused += isRefused(i % 2 == 0 ? spoilt : cut) ? 1 : 0;
      }
    }
    assertTrue(refused > 1000, refused + " refused");
  }

  private static boolean isRefused(byte[] message) {
    try {
      MessageCodec.reply(message);
      return false;
    } catch (BadFrame e) {
      return true;
    }
  }

  private static Channel over(byte[] bytes) {
    return new Channel(new ByteArrayInputStream(bytes), OutputStream.nullOutputStream());
  }
}
