package millrace.ui;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.net.InetAddress;
import java.net.ServerSocket;
import java.nio.file.Path;
import millrace.ui.mart.MartFixture;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CallTest {
  @Test
  void readsBothForms() throws Exception {
    assertEquals(new Call(Path.of("m"), 8080), Call.parse("--mart", "m"));
    assertEquals(new Call(Path.of("m"), 9000), Call.parse("--port=9000", "--mart=m"));
  }

  @Test
  void refusesWithTheMend() {
    assertTrue(wrong("--marts", "m").contains("--mart DIR"));
    assertTrue(wrong().contains("--mart DIR"));
    assertTrue(wrong("--mart").contains("value"));
    assertTrue(wrong("--mart", "m", "--port", "0").contains("1 to 65535"));
  }

  @Test
  void refusesAPortInUse(@TempDir Path folder) throws Exception {
    MartFixture.write(folder);
    try (ServerSocket taken = new ServerSocket(0, 1, InetAddress.getByName(Call.HOST))) {
      Call call = new Call(folder, taken.getLocalPort());
      assertTrue(assertThrows(Call.WrongCall.class, call::check).getMessage().contains("in use"));
    }
  }

  private static String wrong(String... args) {
    return assertThrows(Call.WrongCall.class, () -> Call.parse(args)).getMessage();
  }
}
