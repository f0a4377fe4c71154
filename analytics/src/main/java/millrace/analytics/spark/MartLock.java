package millrace.analytics.spark;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/**
 * The right to write to a mart; the operating system takes it back when the process ends, however
 * it ends.
 */
public final class MartLock implements AutoCloseable {
  private static final String FILE = ".writing";

  private final FileChannel channel;

  private MartLock(FileChannel channel) {
    this.channel = channel;
  }

  /**
   * Takes the lock, making the folder when there is none.
   *
   * @throws RunException if the folder cannot be written or a run is writing there
   */
  public static MartLock take(Path mart) {
    try {
      Files.createDirectories(mart);
    } catch (IOException e) {
      throw RunException.wrongCall(
          mart + " cannot be made; name a folder that this user may write as --mart", e);
    }
    FileChannel channel = null;
    try {
      channel =
          FileChannel.open(mart.resolve(FILE), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
      FileLock lock = channel.tryLock();
      if (lock != null) {
        return new MartLock(channel);
      }
      channel.close();
    } catch (OverlappingFileLockException e) {
      closeQuietly(channel);
    } catch (IOException e) {
      throw RunException.wrongCall(
          mart + " cannot be written; check its permissions and the free space", e);
    }
    throw RunException.wrongCall(
        mart + " is being written by another run; wait for it to end, or name another --mart",
        null);
  }

  /**
   * Makes sure that the lock is still held.
   *
   * @throws IllegalStateException if it was given back
   */
  void requireHeld() {
    if (!channel.isOpen()) {
      throw new IllegalStateException("the lock of the mart was given back");
    }
  }

  @Override
  public void close() throws IOException {
    channel.close();
  }

  private static void closeQuietly(FileChannel channel) {
    try {
      channel.close();
    } catch (IOException e) {
      // The channel only held a lock that this process already has.
      return;
    }
  }
}
