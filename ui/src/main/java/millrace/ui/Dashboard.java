package millrace.ui;

import com.vaadin.flow.component.page.AppShellConfigurator;
import com.vaadin.flow.component.page.Viewport;
import com.vaadin.flow.server.AppShellSettings;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import millrace.ui.mart.Mart;
import org.springframework.boot.Banner;
import org.springframework.boot.SpringApplication;
import org.springframework.boot.autoconfigure.SpringBootApplication;
import org.springframework.context.annotation.Bean;
import org.springframework.core.env.Environment;

/** Starts the dashboard on 127.0.0.1. */
@SpringBootApplication
@Viewport("width=device-width, initial-scale=1")
public class Dashboard implements AppShellConfigurator {
  /** The setting that holds the mart's folder. */
  public static final String MART = "millrace.mart";

  private static final long serialVersionUID = 1L;
  private static final int WRONG_CALL = 2;

  /** Checks the call, starts, and says where it is. */
  public static void main(String[] args) {
    if (Arrays.asList(args).contains("--help") || Arrays.asList(args).contains("-h")) {
      System.out.println(Call.USAGE);
      return;
    }
    try {
      Call call = Call.parse(args);
      call.check();
      start(call);
      System.out.println("The dashboard is at http://" + Call.HOST + ":" + call.port());
    } catch (Call.WrongCall e) {
      System.err.println("millrace-ui: " + e.getMessage().replaceAll("\\s*\\R\\s*", " "));
      System.exit(WRONG_CALL);
    }
  }

  private static void start(Call call) {
    SpringApplication application = new SpringApplication(Dashboard.class);
    application.setBannerMode(Banner.Mode.OFF);
    application.setLogStartupInfo(false);
    Map<String, Object> settings = new HashMap<>();
    settings.put("server.port", call.port());
    settings.put(MART, call.mart().toString());
    application.setDefaultProperties(settings);
    application.run();
  }

  @Override
  public void configurePage(AppShellSettings settings) {
    settings.addMetaTag("color-scheme", "light dark");
    settings.addMetaTag("robots", "noindex");
  }

  /** The mart that all pages read. */
  @Bean
  Mart mart(Environment environment) {
    return new Mart(Path.of(environment.getRequiredProperty(MART)));
  }
}
