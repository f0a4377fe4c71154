package millrace.analytics.exposure;

import java.io.Serializable;
import java.util.List;

/**
 * Classes or agents that must expose at once (methods 7).
 *
 * @param name its name
 * @param members classes or agents
 */
public record Combination(String name, List<String> members) implements Serializable {}
