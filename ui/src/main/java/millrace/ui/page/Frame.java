package millrace.ui.page;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.html.Anchor;
import com.vaadin.flow.component.html.Footer;
import com.vaadin.flow.component.html.Header;
import com.vaadin.flow.component.html.Main;
import com.vaadin.flow.component.html.Nav;
import com.vaadin.flow.component.html.Paragraph;
import com.vaadin.flow.component.html.Span;
import java.time.LocalDate;
import java.util.Locale;
import millrace.analytics.mart.Cautions;
import millrace.analytics.mart.RunManifest;

/** Top line, middle and foot of a page. */
public final class Frame {
  /** Pages of the top line: address and name. */
  private static final String[][] PAGES = {{"month", "The month"}, {"episodes", "Episodes"}};

  private Frame() {}

  /** The line at the top. */
  public static Header top(RunManifest manifest, String current) {
    Header top = top(manifest.site(), current);
    if (invented(manifest)) {
      top.add(Html.span("who", "invented data"));
    }
    return top;
  }

  /** The line at the top of a page that has no run. */
  public static Header top(String site, String current) {
    Header top = new Header();
    top.addClassName("top");
    top.add(Html.span("site", site));
    Nav nav = new Nav();
    nav.getElement().setAttribute("aria-label", "Pages");
    for (String[] page : PAGES) {
      Anchor link = Html.link(page[0], page[1]);
      if (page[0].equals(current)) {
        link.addClassName("on");
        link.getElement().setAttribute("aria-current", "page");
      }
      nav.add(link);
    }
    top.add(nav);
    return top;
  }

  /** The middle. */
  public static Main middle(Component... content) {
    Main main = new Main();
    main.add(content);
    return main;
  }

  /** The cautions, and what the page was computed from. */
  public static Footer foot(RunManifest manifest) {
    Footer foot = new Footer();
    foot.addClassName("foot");
    foot.add(
        new Paragraph(
            String.join(
                " ", manifest.cautions() == null ? Cautions.SENTENCES : manifest.cautions())));
    Paragraph source = new Paragraph();
    source.add(
        new Span(
            manifest.site()
                + ", from "
                + manifest.coversFrom()
                + " to "
                + LocalDate.parse(manifest.coversTo()).minusDays(1)
                + " ("
                + manifest.zone()
                + "). Run "
                + manifest.runId()
                + ", program version "
                + manifest.version()
                + "."));
    foot.add(source);
    return foot;
  }

  /** The foot of a page that has no run. */
  public static Footer foot() {
    Footer foot = new Footer(new Paragraph(String.join(" ", Cautions.SENTENCES)));
    foot.addClassName("foot");
    return foot;
  }

  private static boolean invented(RunManifest manifest) {
    return (manifest.title() + " " + manifest.description())
        .toLowerCase(Locale.ROOT)
        .contains("invented");
  }
}
