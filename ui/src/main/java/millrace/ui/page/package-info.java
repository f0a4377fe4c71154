/**
 * What every page has: top line, foot, tables, numbers in words, and pages that say what is wrong.
 */
package millrace.ui.page;
