package org.treadwarm.web;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.net.Socket;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.CountDownLatch;

/** Stands before a server of this machine and passes everything on, until it is silenced: then it takes and passes nothing. */
final class Relay implements AutoCloseable {
    private final ServerSocket door;
    private final int target;
    private final List<Socket> sockets = new CopyOnWriteArrayList<>();
    private volatile CountDownLatch speech = new CountDownLatch(0);

    /**
     * Opens one on any free port.
     *
     * @param target the port of the server behind it
     */
    Relay(int target) throws IOException {
        this.target = target;
        this.door = new ServerSocket(0, 50, InetAddress.getLoopbackAddress());
        start(this::accept);
    }

    private interface Work {
        void run() throws IOException, InterruptedException;
    }

    private static void start(Work work) {
        Thread thread = new Thread(
                () -> {
                    try {
                        work.run();
                    } catch (IOException ended) {
                        // One side hung up, or the relay was closed.
                    } catch (InterruptedException ended) {
                        Thread.currentThread().interrupt();
                    }
                },
                "relay");
        thread.setDaemon(true);
        thread.start();
    }

    /** The port it listens on. */
    int port() {
        return door.getLocalPort();
    }

    /** Passes nothing on from now. */
    void silence() {
        speech = new CountDownLatch(1);
    }

    /** Passes on again, also what came meanwhile. */
    void speak() {
        speech.countDown();
    }

    private void accept() throws IOException {
        while (true) {
            Socket near = door.accept();
            Socket far = new Socket(InetAddress.getLoopbackAddress(), target);
            sockets.addAll(List.of(near, far));
            start(() -> pass(near, far));
            start(() -> pass(far, near));
        }
    }

    private void pass(Socket from, Socket to) throws IOException, InterruptedException {
        byte[] bytes = new byte[8192];
        try (from;
                to) {
            InputStream in = from.getInputStream();
            OutputStream out = to.getOutputStream();
            for (int count = in.read(bytes); count >= 0; count = in.read(bytes)) {
                speech.await();
                out.write(bytes, 0, count);
                out.flush();
            }
        }
    }

    @Override
    public void close() {
        speak();
        try {
            door.close();
            for (Socket socket : sockets) {
                socket.close();
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
