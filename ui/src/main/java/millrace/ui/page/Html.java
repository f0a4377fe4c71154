package millrace.ui.page;

import com.vaadin.flow.component.Component;
import com.vaadin.flow.component.HtmlContainer;
import com.vaadin.flow.component.html.Anchor;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H2;
import com.vaadin.flow.component.html.Paragraph;
import com.vaadin.flow.component.html.Section;
import com.vaadin.flow.component.html.Span;
import com.vaadin.flow.dom.Element;

/** Small pieces of a page. */
public final class Html {
  private Html() {}

  /** A link inside the dashboard. */
  public static Anchor link(String href, String text) {
    return new Anchor(href, text);
  }

  /** A link, or the plain text when there is nothing behind it. */
  public static Component count(long count, String href) {
    return count == 0 ? new Span("0") : link(href, Say.count(count));
  }

  /** Text of a class. */
  public static Span span(String cssClass, String text) {
    Span span = new Span(text);
    span.addClassName(cssClass);
    return span;
  }

  /** A paragraph of a class. */
  public static Paragraph paragraph(String cssClass, String text) {
    Paragraph paragraph = new Paragraph(text);
    paragraph.addClassName(cssClass);
    return paragraph;
  }

  /** A part of the page with its heading and a sentence on how to read it. */
  public static Section section(String heading, String say, Component... content) {
    Section section = new Section();
    section.add(new H2(heading));
    if (!say.isEmpty()) {
      section.add(paragraph("say", say));
    }
    section.add(content);
    return section;
  }

  /** A block of a class. */
  public static Div div(String cssClass, Component... content) {
    Div div = new Div(content);
    div.addClassName(cssClass);
    return div;
  }

  /** Something that is shown when its line is clicked. */
  public static HtmlContainer fold(String line, Component... content) {
    HtmlContainer details = new HtmlContainer("details");
    details.getElement().appendChild(new Element("summary").setText(line));
    details.add(content);
    return details;
  }
}
