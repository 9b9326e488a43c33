package sillet.store.engine;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import org.h2.store.fs.FileBase;
import org.h2.store.fs.FilePathWrapper;

/** A file layer of H2 whose disk fails when a test says so. */
public final class FaultyFiles extends FilePathWrapper {
  static final String SCHEME = "faulty";
  static final String PREFIX = SCHEME + ":";

  /** How the disk behaves; one for all files, since H2 makes the paths itself. */
  enum Fault {
    NONE,
    ONCE,
    FROM_THEN_ON,
    SYNC_ONLY,
    READ_ONLY
  }

  private static Fault fault = Fault.NONE;
  private static int callsLeft;

  static synchronized void behave(Fault asked, int fromCall) {
    fault = asked;
    callsLeft = fromCall;
  }

  /** Whether the fault was met. */
  static synchronized boolean met() {
    return callsLeft <= 0;
  }

  private static synchronized void writing(boolean sync) throws IOException {
    if (fault == Fault.NONE || fault == Fault.READ_ONLY || (fault == Fault.SYNC_ONLY && !sync)) {
      return;
    }
    callsLeft--;
    if (fault == Fault.ONCE ? callsLeft == 0 : callsLeft <= 0) {
      throw new IOException("No space left on device");
    }
  }

  private static synchronized boolean readOnly() {
    return fault == Fault.READ_ONLY;
  }

  @Override
  public String getScheme() {
    return SCHEME;
  }

  @Override
  public boolean canWrite() {
    return !readOnly() && super.canWrite();
  }

  @Override
  public FileChannel open(String mode) throws IOException {
    if (readOnly() && !mode.equals("r")) {
      throw new java.nio.file.AccessDeniedException(name);
    }
    return new Channel(super.open(mode));
  }

  private static final class Channel extends FileBase {
    private final FileChannel disk;

    Channel(FileChannel disk) {
      this.disk = disk;
    }

    @Override
    public int read(ByteBuffer target) throws IOException {
      return disk.read(target);
    }

    @Override
    public synchronized int read(ByteBuffer target, long position) throws IOException {
      return disk.read(target, position);
    }

    @Override
    public int write(ByteBuffer source) throws IOException {
      writing(false);
      return disk.write(source);
    }

    @Override
    public synchronized int write(ByteBuffer source, long position) throws IOException {
      writing(false);
      return disk.write(source, position);
    }

    @Override
    public long position() throws IOException {
      return disk.position();
    }

    @Override
    public FileChannel position(long position) throws IOException {
      disk.position(position);
      return this;
    }

    @Override
    public long size() throws IOException {
      return disk.size();
    }

    @Override
    public FileChannel truncate(long size) throws IOException {
      writing(false);
      disk.truncate(size);
      return this;
    }

    @Override
    public void force(boolean metaData) throws IOException {
      writing(true);
      disk.force(metaData);
    }

    @Override
    public FileLock tryLock(long position, long size, boolean shared) throws IOException {
      return disk.tryLock(position, size, shared);
    }

    @Override
    protected void implCloseChannel() throws IOException {
      disk.close();
    }
  }
}
