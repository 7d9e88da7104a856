package torqueloom.training.layer;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Properties;
import org.nd4j.linalg.api.buffer.DataBuffer;
import org.nd4j.linalg.api.ndarray.INDArray;
import org.nd4j.linalg.factory.Nd4j;
import org.nd4j.nativeblas.NativeOpsHolder;
import torqueloom.training.layer.MatrixProductCheck.DoubleProduct;
import torqueloom.training.layer.MatrixProductCheck.FloatProduct;

/**
 * Makes sure that the native matrix library may be used, once, before the first network.
 *
 * <p>{@link #ensure()} is called before anything touches the deep-learning library: it refuses a
 * program built for another platform, sets the library to one thread (two would change the bits of
 * a product, and parallel work is done by this program's own threads), and compares products of
 * awkward shapes with plain loops. The first call takes a second or more, since it loads the native
 * code; later ones cost nothing.
 */
public final class NativeCheck {
  private static final String RESOURCE = "native.properties";

  private NativeCheck() {}

  /** Runs at most once, however many threads ask: class initialization is the lock. */
  private static final class Once {
    static final UnfitNativesException FAULT = run();

    private static UnfitNativesException run() {
      try {
        ensurePlatform();
        useOneThread();
        checkProducts();
        return null;
      } catch (UnfitNativesException e) {
        return e;
      }
    }
  }

  /**
   * Checks the native library on the first call and remembers the outcome.
   *
   * @throws UnfitNativesException if the natives are for another platform or products are wrong
   */
  public static void ensure() {
    if (Once.FAULT != null) {
      throw new UnfitNativesException(Once.FAULT.getMessage());
    }
  }

  /**
   * Checks only the platform, which costs nothing: before long work that ends in a network.
   *
   * @throws UnfitNativesException naming both platforms, if the natives are for another one
   */
  public static void ensurePlatform() {
    checkPlatform(builtFor(), hostPlatform());
  }

  /**
   * The platform whose native libraries this build carries.
   *
   * @return for example {@code linux-x86_64}
   */
  public static String builtFor() {
    try (InputStream in = NativeCheck.class.getResourceAsStream(RESOURCE)) {
      final Properties properties = new Properties();
      properties.load(in);
      return properties.getProperty("platform");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /**
   * The platform of the running machine, named as {@link #builtFor()} names it.
   *
   * @return for example {@code macosx-arm64}
   */
  public static String hostPlatform() {
    return platform(System.getProperty("os.name"), System.getProperty("os.arch"));
  }

  /** Maps Java's names of a system and a processor to those of the native libraries. */
  static String platform(String osName, String osArch) {
    final String name = osName.toLowerCase(Locale.ROOT);
    final String system =
        name.startsWith("mac")
            ? "macosx"
            : name.startsWith("windows") ? "windows" : name.replace(' ', '-');
    final String processor =
        switch (osArch.toLowerCase(Locale.ROOT)) {
          case "amd64", "x86_64", "x64" -> "x86_64";
          case "aarch64", "arm64" -> "arm64";
          default -> osArch;
        };
    return system + "-" + processor;
  }

  /**
   * Refuses natives of another platform.
   *
   * @throws UnfitNativesException naming both platforms
   */
  static void checkPlatform(String built, String host) {
    if (!built.equals(host)) {
      throw new UnfitNativesException(
          "this program was built for "
              + built
              + " and cannot run networks on "
              + host
              + ": build it anew on this machine");
    }
  }

  private static void useOneThread() {
    Nd4j.getEnvironment().setMaxThreads(1);
    Nd4j.getEnvironment().setMaxMasterThreads(1);
    NativeOpsHolder.getInstance().getDeviceNativeOps().setOmpNumThreads(1);
    Nd4j.factory().blas().setMaxThreads(1);
  }

  /** Both orders of storage of either factor, since each takes its own path through the kernels. */
  private static void checkProducts() {
    final List<FloatProduct> floats = new ArrayList<>();
    final List<DoubleProduct> doubles = new ArrayList<>();
    for (String orders : new String[] {"cc", "cf", "fc", "ff"}) {
      final char left = orders.charAt(0);
      final char right = orders.charAt(1);
      floats.add(
          (a, b, m, k, n) ->
              product(
                      Nd4j.createFromArray(a).reshape('c', m, k).dup(left),
                      Nd4j.createFromArray(b).reshape('c', k, n).dup(right))
                  .asFloat());
      doubles.add(
          (a, b, m, k, n) ->
              product(
                      Nd4j.createFromArray(a).reshape('c', m, k).dup(left),
                      Nd4j.createFromArray(b).reshape('c', k, n).dup(right))
                  .asDouble());
    }
    MatrixProductCheck.check(floats, doubles);
  }

  private static DataBuffer product(INDArray left, INDArray right) {
    final INDArray product =
        Nd4j.create(left.dataType(), new long[] {left.rows(), right.columns()}, 'f');
    return left.mmuli(right, product).dup('c').data();
  }
}
