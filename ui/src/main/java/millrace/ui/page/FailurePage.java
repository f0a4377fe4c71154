package millrace.ui.page;

import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.ErrorParameter;
import com.vaadin.flow.router.HasErrorParameter;
import java.util.logging.Level;
import java.util.logging.Logger;

/** Something failed that no other page speaks of. */
public class FailurePage extends Trouble implements HasErrorParameter<Exception> {
  private static final long serialVersionUID = 1L;
  private static final Logger LOG = Logger.getLogger(FailurePage.class.getName());

  @Override
  public int setErrorParameter(BeforeEnterEvent event, ErrorParameter<Exception> parameter) {
    LOG.log(Level.SEVERE, "a page failed", parameter.getException());
    say(
        "This page could not be made",
        "The program failed ("
            + parameter.getCaughtException().getClass().getSimpleName()
            + "). What it failed at is in the log.",
        "Load the page again; if it fails again, report it.");
    return 500;
  }
}
