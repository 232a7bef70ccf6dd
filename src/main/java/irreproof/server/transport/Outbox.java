package irreproof.server.transport;

import java.time.Duration;
import java.util.concurrent.BlockingQueue;
import java.util.concurrent.LinkedBlockingQueue;
import org.eclipse.lsp4j.jsonrpc.MessageConsumer;
import org.eclipse.lsp4j.jsonrpc.messages.Message;
import org.eclipse.lsp4j.jsonrpc.messages.NotificationMessage;

/**
 * Hands messages to one writing thread, in order, so that nobody who speaks to the client ever waits for it to read: a
 * client that is itself blocked in writing to us would otherwise hang together with us. The queue has no bound; it
 * grows only while a client asks without reading the answers.
 */
final class Outbox implements MessageConsumer {
    private static final Message END = new NotificationMessage();

    private final BlockingQueue<Message> queue = new LinkedBlockingQueue<>();
    private final Thread writer;

    Outbox(MessageConsumer stream) {
        writer = new Thread(() -> write(stream), "irreproof-writer");
        writer.setDaemon(true);
        writer.start();
    }

    @Override
    public void consume(Message message) {
        queue.add(message);
    }

    private void write(MessageConsumer stream) {
        try {
            for (Message message = queue.take(); message != END; message = queue.take()) {
                stream.consume(message);
            }
        } catch (RuntimeException e) {
            // The client's end is closed; the reading side learns the same and ends the server.
            queue.clear();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    /** Writes what is queued, but gives up after the time limit. */
    void close(Duration limit) {
        queue.add(END);
        try {
            writer.join(limit.toMillis());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
