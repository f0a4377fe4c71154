package millrace.ui.page;

import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.ErrorParameter;
import com.vaadin.flow.router.HasErrorParameter;
import com.vaadin.flow.router.NotFoundException;

/** There is nothing at this address. */
public class NotFoundPage extends Trouble implements HasErrorParameter<NotFoundException> {
  private static final long serialVersionUID = 1L;

  @Override
  public int setErrorParameter(
      BeforeEnterEvent event, ErrorParameter<NotFoundException> parameter) {
    say(
        "There is no such page",
        "The served run has no page or episode at this address.",
        "Episodes get new names with each run.");
    return 404;
  }
}
