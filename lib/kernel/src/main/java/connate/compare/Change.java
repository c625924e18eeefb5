package connate.compare;

/**
 * One difference between two logs.
 *
 * @param what the kind: input, assumption, workbook, result
 * @param name which one
 * @param was how it was, empty where it was not there
 * @param is how it is, empty where it is gone
 * @param words the difference in words
 */
public record Change(String what, String name, String was, String is, String words) {}
