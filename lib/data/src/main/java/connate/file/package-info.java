/** How does a file get to disk whole? {@link connate.file.AtomicFile} is the one way to write. */
package connate.file;
