/**
 * The name and the house look: the mark, the look of the window at first start, the theme and the colours of charts.
 *
 * <p>Knows the platform, JFreeChart and nothing of the other modules. Colours are computed in OKLab (Ottosson 2020),
 * where equal distances look equally large. Read {@link org.wellwright.branding.ChartTheme} and
 * {@link org.wellwright.branding.ColourScale} first.
 */
package org.wellwright.branding;
