package millrace.ui.page;

import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.ErrorParameter;
import com.vaadin.flow.router.HasErrorParameter;
import millrace.ui.mart.MartException;

/** The mart cannot be read. */
public class MartPage extends Trouble implements HasErrorParameter<MartException> {
  private static final long serialVersionUID = 1L;

  @Override
  public int setErrorParameter(BeforeEnterEvent event, ErrorParameter<MartException> parameter) {
    say(
        "There are no numbers to show",
        "Because " + parameter.getException().getMessage() + ".",
        "Then load this page again.");
    return 503;
  }
}
