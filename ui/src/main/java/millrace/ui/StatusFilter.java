package millrace.ui;

import jakarta.servlet.FilterChain;
import jakarta.servlet.ServletException;
import jakarta.servlet.http.HttpServletRequest;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import millrace.analytics.mart.EpisodeRow;
import millrace.ui.mart.Condition;
import millrace.ui.mart.Mart;
import millrace.ui.mart.MartException;
import org.springframework.stereotype.Component;
import org.springframework.web.filter.OncePerRequestFilter;

/**
 * Gives a page that is not there its status 404, and 503 when there is no run: the pages themselves
 * are filled only after the first answer.
 */
@Component
public class StatusFilter extends OncePerRequestFilter {
  private static final String EPISODES = "/episodes/";

  private final Mart mart;

  /** Made once. */
  public StatusFilter(Mart mart) {
    this.mart = mart;
  }

  @Override
  protected void doFilterInternal(
      HttpServletRequest request, HttpServletResponse response, FilterChain chain)
      throws ServletException, IOException {
    String path = request.getServletPath();
    if (request.getMethod().equals("GET") && isPage(request, path)) {
      int status = status(path);
      if (status != HttpServletResponse.SC_OK) {
        response.setStatus(status);
      }
    }
    chain.doFilter(request, response);
  }

  private static boolean isPage(HttpServletRequest request, String path) {
    return request.getParameter("v-r") == null
        && !path.startsWith("/VAADIN/")
        && !path.startsWith("/webjars/")
        && path.indexOf('.') < 0;
  }

  private int status(String path) {
    try {
      if (path.startsWith(EPISODES) && path.length() > EPISODES.length()) {
        Condition condition = Condition.equal("episode_id", path.substring(EPISODES.length()));
        return mart.open().count(EpisodeRow.class, condition) > 0
            ? HttpServletResponse.SC_OK
            : HttpServletResponse.SC_NOT_FOUND;
      }
      if (path.isEmpty()
          || path.equals("/")
          || path.equals("/month")
          || path.equals("/episodes")
          || path.equals(EPISODES)) {
        mart.open();
        return HttpServletResponse.SC_OK;
      }
      return HttpServletResponse.SC_NOT_FOUND;
    } catch (MartException e) {
      return HttpServletResponse.SC_SERVICE_UNAVAILABLE;
    }
  }
}
