package irreproof.server.transport;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.function.Consumer;
import org.eclipse.lsp4j.jsonrpc.Endpoint;
import org.eclipse.lsp4j.jsonrpc.ResponseErrorException;
import org.eclipse.lsp4j.jsonrpc.json.JsonRpcMethod;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseError;
import org.eclipse.lsp4j.jsonrpc.messages.ResponseErrorCode;
import org.eclipse.lsp4j.jsonrpc.services.GenericEndpoint;
import org.eclipse.lsp4j.jsonrpc.services.ServiceEndpoints;

/**
 * Passes each message to the service that has a method for it, and holds the protocol's order: {@code initialize} comes
 * first, after {@code shutdown} only {@code exit}. A request that nobody serves is refused at once; a notification that
 * nobody serves is dropped, as the protocol asks.
 */
final class Dispatcher implements Endpoint {
    /** Where the conversation stands. */
    private enum Phase {
        NEW,
        RUNNING,
        SHUT_DOWN
    }

    private final Map<String, JsonRpcMethod> methods = new LinkedHashMap<>();
    private final Consumer<Throwable> problems;
    private Endpoint services;
    private Phase phase = Phase.NEW;

    /** @param problems told of every notification that fails, since nothing can be answered to one */
    Dispatcher(Consumer<Throwable> problems) {
        this.problems = problems;
    }

    /** To be called once, before the first message. */
    Map<String, JsonRpcMethod> serve(List<Object> objects) {
        objects.forEach(service -> methods.putAll(ServiceEndpoints.getSupportedMethods(service.getClass())));
        services = new GenericEndpoint(objects);
        return methods;
    }

    @Override
    public CompletableFuture<?> request(String method, Object parameter) {
        boolean initialize = method.equals("initialize");
        if (phase == Phase.NEW && !initialize) {
            return refuse(ResponseErrorCode.ServerNotInitialized, method + " came before initialize");
        }
        if (phase == Phase.SHUT_DOWN || phase == Phase.RUNNING && initialize) {
            return refuse(ResponseErrorCode.InvalidRequest, method + " came too late");
        }
        JsonRpcMethod known = methods.get(method);
        if (known == null || known.isNotification()) {
            return refuse(ResponseErrorCode.MethodNotFound, "there is no request " + method + " here");
        }
        if (lacksParameter(known, parameter)) {
            return refuse(ResponseErrorCode.InvalidParams, method + " needs parameters");
        }
        CompletableFuture<?> answer = services.request(method, parameter);
        if (initialize) {
            phase = Phase.RUNNING;
        } else if (method.equals("shutdown")) {
            phase = Phase.SHUT_DOWN;
        }
        return answer;
    }

    @Override
    public void notify(String method, Object parameter) {
        JsonRpcMethod known = methods.get(method);
        if (known == null || !known.isNotification() || phase != Phase.RUNNING && !method.equals("exit")) {
            return;
        }
        try {
            if (lacksParameter(known, parameter)) {
                throw new IllegalArgumentException(method + " needs parameters");
            }
            services.notify(method, parameter);
        } catch (RuntimeException e) {
            problems.accept(e);
        }
    }

    private static boolean lacksParameter(JsonRpcMethod method, Object parameter) {
        return parameter == null && method.getParameterTypes().length > 0;
    }

    private static CompletableFuture<?> refuse(ResponseErrorCode code, String message) {
        return CompletableFuture.failedFuture(new ResponseErrorException(new ResponseError(code, message, null)));
    }
}
