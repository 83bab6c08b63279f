/**
 * The project file: JSON values with the spelling of their numbers, the reader and writer of format version 1, and
 * saving that loses nothing.
 *
 * <p>Knows the project and Jackson's streaming parser; nobody outside {@code file} and {@code run} sees Jackson. Read
 * {@link org.wellwright.project.file.ProjectFile} and {@link org.wellwright.project.file.JsonValue} first.
 */
package org.wellwright.project.file;
