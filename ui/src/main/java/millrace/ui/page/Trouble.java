package millrace.ui.page;

import com.vaadin.flow.component.dependency.StyleSheet;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.H1;
import com.vaadin.flow.component.html.Paragraph;
import com.vaadin.flow.router.HasDynamicTitle;

/** A page that says in words what is wrong and how to go on. */
@StyleSheet("context://millrace.css")
abstract class Trouble extends Div implements HasDynamicTitle {
  private static final long serialVersionUID = 1L;

  private String title = "Millrace";

  /** Shows it. */
  void say(String heading, String what, String goOn) {
    removeAll();
    addClassName("page");
    title = heading;
    Paragraph on = new Paragraph(goOn + " ");
    on.add(Html.link("month", "Go to the month"), new com.vaadin.flow.component.Text(" or to "));
    on.add(Html.link("episodes", "the episodes"), new com.vaadin.flow.component.Text("."));
    add(
        Frame.top("Millrace", ""),
        Frame.middle(new H1(heading), Html.paragraph("lead", what), on),
        Frame.foot());
  }

  @Override
  public final String getPageTitle() {
    return title;
  }
}
