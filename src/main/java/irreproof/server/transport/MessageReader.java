package irreproof.server.transport;

import java.io.IOException;
import java.io.InputStream;
import java.io.StringReader;
import java.util.Locale;
import java.util.function.Consumer;
import org.eclipse.lsp4j.jsonrpc.MessageConsumer;
import org.eclipse.lsp4j.jsonrpc.MessageIssueException;
import org.eclipse.lsp4j.jsonrpc.MessageIssueHandler;
import org.eclipse.lsp4j.jsonrpc.json.MessageJsonHandler;
import org.eclipse.lsp4j.jsonrpc.json.StreamMessageProducer;
import org.eclipse.lsp4j.jsonrpc.messages.Message;

/**
 * Reads messages and survives the malformed ones. A message's body is always taken from the stream as a whole before it
 * is parsed, so that a broken one cannot be mistaken for the head of the next.
 */
final class MessageReader extends StreamMessageProducer {
    /** Larger than any manuscript; a longer body is skipped. */
    private static final int LARGEST_BODY = 1 << 27;

    private final MessageJsonHandler json;
    private final MessageIssueHandler issues;
    private final Consumer<Throwable> problems;
    private MessageConsumer consumer;

    MessageReader(
            InputStream input, MessageJsonHandler json, MessageIssueHandler issues, Consumer<Throwable> problems) {
        super(input, json, issues);
        this.json = json;
        this.issues = issues;
        this.problems = problems;
    }

    /** Returns at the end of the input, or after the message that is being handled when {@link #close} is called. */
    @Override
    public void listen(MessageConsumer messageConsumer) {
        consumer = messageConsumer;
        super.listen(messageConsumer);
    }

    /** Header names are case-insensitive, as in every protocol that took them from mail. */
    @Override
    protected void parseHeader(String line, Headers headers) {
        int colon = line.indexOf(':');
        String name = colon < 0 ? "" : line.substring(0, colon).strip().toLowerCase(Locale.ROOT);
        super.parseHeader(
                name.equals("content-length") ? CONTENT_LENGTH_HEADER + line.substring(colon) : line, headers);
    }

    @Override
    protected boolean handleMessage(InputStream input, Headers headers) {
        try {
            if (headers.contentLength > LARGEST_BODY) {
                input.skipNBytes(headers.contentLength);
                throw new IllegalArgumentException("a message of " + headers.contentLength + " bytes was skipped");
            }
            byte[] body = input.readNBytes(headers.contentLength);
            if (body.length < headers.contentLength) {
                return false;
            }
            handle(new String(body, headers.charset));
        } catch (IOException | RuntimeException | StackOverflowError e) {
            problems.accept(e);
        }
        return true;
    }

    private void handle(String body) {
        try {
            Message message = json.parseMessage(new StringReader(body));
            if (message == null) {
                throw new IllegalArgumentException("an empty message");
            }
            consumer.consume(message);
        } catch (MessageIssueException e) {
            issues.handle(e.getRpcMessage(), e.getIssues());
            problems.accept(e);
        }
    }

    @Override
    protected void fireError(Throwable error) {
        problems.accept(error);
    }

    @Override
    protected void fireStreamClosed(Exception cause) {
        // The client went away without a word; that is an end like any other.
    }
}
