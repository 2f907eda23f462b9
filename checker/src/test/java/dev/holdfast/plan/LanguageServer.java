package dev.holdfast.plan;

import java.io.BufferedInputStream;
import java.io.ByteArrayOutputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.TimeUnit;
import java.util.function.Predicate;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;
import tools.jackson.databind.node.ArrayNode;
import tools.jackson.databind.node.ObjectNode;

/**
 * A client for the language server that YAML editors run, speaking the Language Server Protocol
 * over its standard input and output. What the server asks of an editor it answers as an editor
 * does that has no settings, but for the store of schemas on the network, which is switched off.
 */
final class LanguageServer implements AutoCloseable {
  private final JsonMapper mapper = new JsonMapper();
  private final Process process;
  private final InputStream in;
  private final OutputStream out;
  private int lastId;

  LanguageServer(Path script) throws IOException {
    process =
        new ProcessBuilder("node", script.toString(), "--stdio")
            .redirectError(ProcessBuilder.Redirect.DISCARD)
            .start();
    in = new BufferedInputStream(process.getInputStream());
    out = process.getOutputStream();
    ObjectNode parameters = mapper.createObjectNode();
    parameters.put("processId", ProcessHandle.current().pid());
    parameters.putNull("rootUri");
    ObjectNode capabilities = parameters.putObject("capabilities");
    capabilities.putObject("workspace").put("configuration", true);
    ObjectNode document = capabilities.putObject("textDocument");
    document.putObject("hover").putArray("contentFormat").add("markdown");
    document.putObject("completion").putObject("completionItem").put("snippetSupport", true);
    request("initialize", parameters);
    tell("initialized", mapper.createObjectNode());
  }

  /** Opens a document and waits for what the server finds wrong in it. */
  List<JsonNode> open(URI uri, String text) throws IOException {
    ObjectNode parameters = mapper.createObjectNode();
    parameters
        .putObject("textDocument")
        .put("uri", uri.toString())
        .put("languageId", "yaml")
        .put("version", 1)
        .put("text", text);
    tell("textDocument/didOpen", parameters);
    JsonNode published =
        await(
            message ->
                message.path("method").asString("").equals("textDocument/publishDiagnostics")
                    && message.at("/params/uri").asString("").equals(uri.toString()));
    return List.copyOf(published.at("/params/diagnostics").values());
  }

  /** The text shown over a place, lines and characters from 0. */
  String hover(URI uri, int line, int character) throws IOException {
    return request("textDocument/hover", position(uri, line, character))
        .at("/contents/value")
        .asString("");
  }

  /** The words offered at a place, lines and characters from 0. */
  List<String> completion(URI uri, int line, int character) throws IOException {
    JsonNode result = request("textDocument/completion", position(uri, line, character));
    JsonNode items = result.isArray() ? result : result.path("items");
    return items.valueStream().map(item -> item.path("label").asString()).toList();
  }

  private ObjectNode position(URI uri, int line, int character) {
    ObjectNode parameters = mapper.createObjectNode();
    parameters.putObject("textDocument").put("uri", uri.toString());
    parameters.putObject("position").put("line", line).put("character", character);
    return parameters;
  }

  private JsonNode request(String method, JsonNode parameters) throws IOException {
    int id = ++lastId;
    ObjectNode message = mapper.createObjectNode().put("id", id).put("method", method);
    message.set("params", parameters);
    send(message);
    JsonNode answer =
        await(received -> received.path("id").asInt(-1) == id && !received.has("method"));
    if (answer.has("error")) {
      throw new IOException(method + ": " + answer.path("error"));
    }
    return answer.path("result");
  }

  private void tell(String method, JsonNode parameters) throws IOException {
    ObjectNode message = mapper.createObjectNode().put("method", method);
    message.set("params", parameters);
    send(message);
  }

  private JsonNode await(Predicate<JsonNode> wanted) throws IOException {
    while (true) {
      JsonNode message = receive();
      if (message.has("id") && message.has("method")) {
        answer(message);
      } else if (wanted.test(message)) {
        return message;
      }
    }
  }

  private void answer(JsonNode asked) throws IOException {
    ObjectNode answer = mapper.createObjectNode();
    answer.set("id", asked.path("id"));
    if (asked.path("method").asString().equals("workspace/configuration")) {
      ArrayNode settings = answer.putArray("result");
      for (JsonNode item : asked.at("/params/items")) {
        ObjectNode section = settings.addObject();
        if (item.path("section").asString("").equals("yaml")) {
          section.put("validate", true).put("hover", true).put("completion", true);
          section.putObject("schemaStore").put("enable", false);
        }
      }
    } else {
      answer.putNull("result");
    }
    send(answer);
  }

  private void send(ObjectNode message) throws IOException {
    byte[] body = mapper.writeValueAsBytes(message.put("jsonrpc", "2.0"));
    out.write(("Content-Length: " + body.length + "\r\n\r\n").getBytes(StandardCharsets.US_ASCII));
    out.write(body);
    out.flush();
  }

  private JsonNode receive() throws IOException {
    int length = -1;
    for (String line = header(); !line.isEmpty(); line = header()) {
      String[] parts = line.split(":", 2);
      if (parts[0].toLowerCase(Locale.ROOT).equals("content-length")) {
        length = Integer.parseInt(parts[1].strip());
      }
    }
    byte[] body = in.readNBytes(length);
    if (body.length < length) {
      throw new EOFException("the language server ended");
    }
    return mapper.readTree(body);
  }

  private String header() throws IOException {
    ByteArrayOutputStream line = new ByteArrayOutputStream();
    for (int b = in.read(); b != '\n'; b = in.read()) {
      if (b < 0) {
        throw new EOFException("the language server ended");
      }
      if (b != '\r') {
        line.write(b);
      }
    }
    return line.toString(StandardCharsets.US_ASCII);
  }

  @Override
  public void close() throws IOException {
    process.destroy();
    try {
      if (!process.waitFor(5, TimeUnit.SECONDS)) {
        process.destroyForcibly();
      }
    } catch (InterruptedException e) {
      process.destroyForcibly();
      Thread.currentThread().interrupt();
    }
  }
}
