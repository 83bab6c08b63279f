/** Windows that change a project. */
package org.wellwright.editor;
