package millrace.ui.page;

import com.vaadin.flow.router.BeforeEnterEvent;
import com.vaadin.flow.router.ErrorParameter;
import com.vaadin.flow.router.HasErrorParameter;

/** The address has a value that cannot be read. */
public class BadAddressPage extends Trouble implements HasErrorParameter<BadAddress> {
  private static final long serialVersionUID = 1L;

  @Override
  public int setErrorParameter(BeforeEnterEvent event, ErrorParameter<BadAddress> parameter) {
    say(
        "This address cannot be read",
        parameter.getException().getMessage(),
        "Change the address, or follow a link.");
    return 400;
  }
}
