/** Reading a hospital extract by its contract: options, plan, exit statuses. */
package millrace.etl;
