package torqueloom.training.layer;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.nd4j.linalg.factory.Nd4j;

class NativeCheckTest {

  @Test
  void theBuildCarriesTheNativesOfThisMachine() {
    assertEquals(NativeCheck.hostPlatform(), NativeCheck.builtFor());
  }

  @Test
  void theLibraryIsFitAndUsesOneThread() {
    assertDoesNotThrow(NativeCheck::ensure);
    assertEquals(1, Nd4j.factory().blas().getMaxThreads());
    assertEquals(1, Nd4j.getEnvironment().maxThreads());
  }

  @ParameterizedTest
  @CsvSource({
    "Linux, amd64, linux-x86_64",
    "Linux, aarch64, linux-arm64",
    "Mac OS X, x86_64, macosx-x86_64",
    "Mac OS X, aarch64, macosx-arm64",
    "Windows 11, amd64, windows-x86_64",
    "FreeBSD, amd64, freebsd-x86_64",
  })
  void javaNamesMapToPlatforms(String osName, String osArch, String platform) {
    assertEquals(platform, NativeCheck.platform(osName, osArch));
  }

  @Test
  void nativesOfAnotherPlatformAreRefusedByName() {
    final UnfitNativesException fault =
        assertThrows(
            UnfitNativesException.class,
            () -> NativeCheck.checkPlatform("macosx-arm64", "linux-x86_64"));
    assertTrue(fault.getMessage().contains("macosx-arm64"), fault.getMessage());
    assertTrue(fault.getMessage().contains("linux-x86_64"), fault.getMessage());
  }
}
