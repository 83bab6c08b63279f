/** A potential family added from outside, as a third party would. */
package org.wellwright.example;
