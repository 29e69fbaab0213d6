package org.kappatrail.browser;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.WebSocket;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionStage;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;

/** Calls and events of the DevTools protocol over one socket. */
final class DevTools {
  private static final long PATIENCE_SECONDS = 60;
  private static final ObjectMapper JSON = new ObjectMapper();

  private final AtomicInteger lastId = new AtomicInteger();
  private final Map<Integer, CompletableFuture<JsonNode>> waiting = new ConcurrentHashMap<>();
  private final List<JsonNode> events = new CopyOnWriteArrayList<>();
  private final WebSocket socket;

  private DevTools(URI address) {
    socket =
        HttpClient.newHttpClient().newWebSocketBuilder().buildAsync(address, new Ears()).join();
  }

  static DevTools connect(URI address) {
    return new DevTools(address);
  }

  /** Calls a method and waits for its result; a session of "" is the browser itself. */
  JsonNode call(String session, String method, Map<String, ?> parameters) {
    int id = lastId.incrementAndGet();
    Map<String, Object> message = new LinkedHashMap<>();
    message.put("id", id);
    message.put("method", method);
    message.put("params", parameters);
    if (!session.isEmpty()) {
      message.put("sessionId", session);
    }
    CompletableFuture<JsonNode> answer = new CompletableFuture<>();
    waiting.put(id, answer);
    try {
      synchronized (socket) {
        socket.sendText(JSON.writeValueAsString(message), true).join();
      }
    } catch (JsonProcessingException e) {
      throw new IllegalArgumentException(e);
    }
    JsonNode reply = answer.orTimeout(PATIENCE_SECONDS, TimeUnit.SECONDS).join();
    if (reply.has("error")) {
      throw new IllegalStateException(method + ": " + reply.get("error"));
    }
    return reply.get("result");
  }

  /** Events of a session so far. */
  List<JsonNode> events(String session, String method) {
    return events.stream()
        .filter(event -> event.path("sessionId").asText().equals(session))
        .filter(event -> event.path("method").asText().equals(method))
        .map(event -> event.get("params"))
        .toList();
  }

  private final class Ears implements WebSocket.Listener {
    private final StringBuilder heard = new StringBuilder();

    @Override
    public CompletionStage<?> onText(WebSocket from, CharSequence data, boolean last) {
      heard.append(data);
      if (last) {
        String message = heard.toString();
        heard.setLength(0);
        take(message);
      }
      from.request(1);
      return CompletableFuture.completedFuture(null);
    }

    private void take(String message) {
      try {
        JsonNode node = JSON.readTree(message);
        if (node.has("id")) {
          CompletableFuture<JsonNode> answer = waiting.remove(node.get("id").asInt());
          if (answer != null) {
            answer.complete(node);
          }
        } else {
          events.add(node);
        }
      } catch (JsonProcessingException e) {
        throw new IllegalStateException(message, e);
      }
    }
  }
}
