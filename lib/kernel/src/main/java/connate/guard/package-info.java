/**
 * What may a workbook's commands do? {@link connate.guard.Guard} looks through compiled classes
 * before they are loaded and refuses what the list {@code allow.txt} beside it does not name. Read
 * that list first.
 *
 * <p>It is a policy, not a wall: it keeps an honest workbook from surprising its reader, and stops
 * whoever is determined only so far.
 */
package connate.guard;
