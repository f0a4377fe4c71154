/** Episodes: the list with its filters, and the page of one. */
package millrace.ui.episodes;
