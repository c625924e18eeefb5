/** What the tests of methods share: the annotation of a check, the open data beside the project. */
package connate.checks;
