/** Tests of the editor as a whole, and the project that they use. */
package org.wellwright.editor;
