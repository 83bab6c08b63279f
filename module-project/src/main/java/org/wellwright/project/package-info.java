/** The project: document, session, and what others may know of them. */
package org.wellwright.project;
