/**
 * What a console session remembers, and how it survives: {@link connate.session.Journal} writes
 * each command to disk before it runs, {@link connate.session.SessionBook} holds what worked, in
 * the order of a workbook, {@link connate.session.Journals} finds the sessions that did not end
 * well.
 */
package connate.session;
