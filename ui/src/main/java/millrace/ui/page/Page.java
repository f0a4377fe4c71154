package millrace.ui.page;

import com.vaadin.flow.component.dependency.StyleSheet;
import com.vaadin.flow.component.html.Div;
import com.vaadin.flow.component.html.Main;
import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.BeforeEnterObserver;
import com.vaadin.flow.router.HasDynamicTitle;
import com.vaadin.flow.router.NotFoundException;
import millrace.ui.mart.Mart;
import millrace.ui.mart.MartException;
import millrace.ui.mart.Run;

/** A page of the served run, built anew at each visit. */
@StyleSheet("context://millrace.css")
public abstract class Page extends Div implements BeforeEnterObserver, HasDynamicTitle {
  private static final long serialVersionUID = 1L;

  private final transient Mart mart;
  private final String name;
  private String title = "Millrace";

  /**
   * Takes what all pages need.
   *
   * @param mart where runs are
   * @param name the page's address in the top line
   */
  protected Page(Mart mart, String name) {
    this.mart = mart;
    this.name = name;
    addClassName("page");
  }

  /**
   * Fills the middle.
   *
   * @return title of the page
   * @throws BadAddress if the address has values that cannot be read
   * @throws NotFoundException if it names something that is not there
   */
  protected abstract String build(BeforeEnterEvent event, Run run, Main middle);

  @Override
  public final void beforeEnter(BeforeEnterEvent event) {
    removeAll();
    try {
      Run run = mart.open();
      Main middle = Frame.middle();
      title = build(event, run, middle) + " — " + run.manifest().site();
      add(Frame.top(run.manifest(), name), middle, Frame.foot(run.manifest()));
    } catch (BadAddress | NotFoundException | MartException e) {
      event.rerouteToError(e, e.getMessage());
    }
  }

  @Override
  public final String getPageTitle() {
    return title;
  }
}
