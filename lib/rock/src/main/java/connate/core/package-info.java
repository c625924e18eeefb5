/**
 * What turns a laboratory value into the rock's own: gas slip, stress. Read {@link
 * connate.core.Klinkenberg} first.
 */
package connate.core;
