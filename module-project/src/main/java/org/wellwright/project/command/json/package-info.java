/** Results as JSON, written by the streaming generator alone. */
package org.wellwright.project.command.json;
