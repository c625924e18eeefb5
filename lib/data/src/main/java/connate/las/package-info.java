/**
 * What is in a LAS file? Reads and writes the open well log format of the Canadian Well Logging
 * Society in its versions 1.2, 2.0 and 3.0.
 *
 * <p>Read {@link connate.las.LasFile} first: header lines as they stand, curves as columns, and a
 * list of {@link connate.las.Quirk}s, one for everything in the file that the standard does not
 * foresee or that a reader of the numbers must know. The reader never moves a value to another
 * column and never guesses silently: where the file leaves two readings open it refuses with the
 * place and says how to choose. {@link connate.las.LasWriter} writes version 2.0.
 *
 * <p>Most users want {@code connate.well.Well}, which adds units and roles.
 *
 * <p>The rules follow the texts of the standard: LAS 2.0 of September 1992 with the updates of 2014
 * and 2017, LAS 3.0 of June 2000; 1.2 as met in files.
 */
package connate.las;
