/** Published and invented cases, end to end through the extract contract. */
package millrace.analytics.cases;
