package etchloom.testing;

import java.io.IOException;
import java.io.InputStream;
import java.net.InetSocketAddress;
import java.net.Socket;
import java.nio.charset.StandardCharsets;
import java.util.Locale;

/**
 * An answer of a web server, asked for over a plain socket, so that nothing tidies the request up.
 *
 * @param head status line and headers, names in lower case
 */
public record Page(int status, String head, String body) {

  /** Asks as a browser does. */
  public static Page get(InetSocketAddress server, String path) throws IOException {
    return ask(server, "GET " + path, "127.0.0.1:" + server.getPort());
  }

  /**
   * @param request method and target, as they stand in the request line
   * @param host the header's value
   */
  public static Page ask(InetSocketAddress server, String request, String host) throws IOException {
    return raw(server, request + " HTTP/1.1\r\nHost: " + host + "\r\n");
  }

  /**
   * @param lines of the request, each with its end, without the empty line
   */
  public static Page raw(InetSocketAddress server, String lines) throws IOException {
    try (Socket socket = new Socket()) {
      socket.connect(server, 5_000);
      socket.setSoTimeout(10_000);
      String request = lines + "Connection: close\r\n\r\n";
      socket.getOutputStream().write(request.getBytes(StandardCharsets.US_ASCII));
      InputStream in = socket.getInputStream();
      String all = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      int end = all.indexOf("\r\n\r\n");
      String head = all.substring(0, end).toLowerCase(Locale.ROOT);
      return new Page(Integer.parseInt(head.split(" ")[1]), head, all.substring(end + 4));
    }
  }
}
