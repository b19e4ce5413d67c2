package coilwright.cli;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;

/**
 * A file that is written whole or not at all: a temporary file beside it, then one atomic move.
 *
 * @param target where it shall stand
 * @param force whether an existing file may be replaced
 */
record WholeFile(Path target, boolean force) {

  /** Temporary files that other runs may have left: so many names are tried. */
  private static final int NAMES = 100;

  /** Refuses a target that is no plain file, lacks its folder, or exists already. */
  void refuseIfBad() {
    if (!Files.isDirectory(folder())) {
      throw Refusal.usage(name() + ": its folder does not exist; make the folder first");
    }
    if (!Files.exists(target, LinkOption.NOFOLLOW_LINKS)) {
      return;
    }
    if (!Files.isRegularFile(target, LinkOption.NOFOLLOW_LINKS)) {
      throw Refusal.usage(name() + ": is " + kind() + ", no plain file; give --out another name");
    }
    if (!force) {
      throw Refusal.usage(name() + ": exists already; give another name, or --force to replace it");
    }
  }

  private String kind() {
    if (Files.isSymbolicLink(target)) {
      return "a symbolic link";
    }
    return Files.isDirectory(target) ? "a folder" : "a device or pipe";
  }

  private String name() {
    return PlainText.line(target.toString());
  }

  private Path folder() {
    return target.toAbsolutePath().getParent();
  }

  /**
   * Writes the text; where that fails nothing is left behind.
   *
   * @param text goes out as UTF-8
   */
  void write(String text) {
    Path temporary = null;
    try {
      temporary = temporary();
      fill(temporary, ByteBuffer.wrap(text.getBytes(StandardCharsets.UTF_8)));
      refuseIfBad();
      Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE);
      temporary = null;
    } catch (AtomicMoveNotSupportedException e) {
      throw failure("its file system has no atomic move");
    } catch (IOException e) {
      throw failure(Refusal.reason(e));
    } finally {
      discard(temporary);
    }
  }

  /** A new empty file with the rights that the user's new files have. */
  private Path temporary() throws IOException {
    String stem = ".coilwright-" + ProcessHandle.current().pid() + "-";
    for (int number = 1; number < NAMES; number++) {
      try {
        return Files.createFile(folder().resolve(stem + number + ".tmp"));
      } catch (FileAlreadyExistsException e) {
        // Left by a run that was killed.
      }
    }
    throw new IOException("too many files " + stem + "*.tmp beside it");
  }

  private static void fill(Path file, ByteBuffer bytes) throws IOException {
    try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE)) {
      while (bytes.hasRemaining()) {
        channel.write(bytes);
      }
      channel.force(true);
    }
  }

  private Refusal failure(String reason) {
    return Refusal.failure(
        name() + ": cannot be written (" + reason + "); give --out a place that can be");
  }

  private static void discard(Path temporary) {
    try {
      if (temporary != null) {
        Files.deleteIfExists(temporary);
      }
    } catch (IOException e) {
      // The failure to write is what is reported.
    }
  }
}
