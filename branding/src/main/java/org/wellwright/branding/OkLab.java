package org.wellwright.branding;

import java.awt.Color;

/**
 * A colour in the OKLab space: lightness 0…1, a towards red, b towards yellow. Equal distances look about equally
 * different.
 *
 * <p>Source: B. Ottosson (2020), "A perceptual color space for image processing"; the sRGB transfer curve is that of
 * IEC 61966-2-1. White is D65.
 */
record OkLab(double lightness, double a, double b) {
    /** From lightness, chroma and hue in degrees. */
    static OkLab polar(double lightness, double chroma, double hueDegrees) {
        double hue = Math.toRadians(hueDegrees);
        return new OkLab(lightness, chroma * Math.cos(hue), chroma * Math.sin(hue));
    }

    /** From linear sRGB, each component in 0…1. */
    static OkLab ofLinear(double red, double green, double blue) {
        double l = Math.cbrt(0.4122214708 * red + 0.5363325363 * green + 0.0514459929 * blue);
        double m = Math.cbrt(0.2119034982 * red + 0.6806995451 * green + 0.1073969566 * blue);
        double s = Math.cbrt(0.0883024619 * red + 0.2817188376 * green + 0.6299787005 * blue);
        return new OkLab(
                0.2104542553 * l + 0.7936177850 * m - 0.0040720468 * s,
                1.9779984951 * l - 2.4285922050 * m + 0.4505937099 * s,
                0.0259040371 * l + 0.7827717662 * m - 0.8086757660 * s);
    }

    static OkLab of(Color colour) {
        return ofLinear(toLinear(colour.getRed()), toLinear(colour.getGreen()), toLinear(colour.getBlue()));
    }

    /** Linear sRGB: red, green, blue; a component outside 0…1 cannot be shown. */
    double[] toLinear() {
        double l = cube(lightness + 0.3963377774 * a + 0.2158037573 * b);
        double m = cube(lightness - 0.1055613458 * a - 0.0638541728 * b);
        double s = cube(lightness - 0.0894841775 * a - 1.2914855480 * b);
        return new double[] {
            4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s,
            -1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s,
            -0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s
        };
    }

    /** The colour on screen; what cannot be shown is clipped component by component. */
    Color toColor() {
        double[] rgb = toLinear();
        return new Color(toByte(rgb[0]), toByte(rgb[1]), toByte(rgb[2]));
    }

    double distance(OkLab other) {
        return Math.hypot(Math.hypot(lightness - other.lightness, a - other.a), b - other.b);
    }

    /** The linear intensity 0…1 of an sRGB component 0…255. */
    static double toLinear(int component) {
        double c = component / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }

    private static int toByte(double linear) {
        double c = Math.min(1, Math.max(0, linear));
        double encoded = c <= 0.0031308 ? 12.92 * c : 1.055 * Math.pow(c, 1 / 2.4) - 0.055;
        return (int) Math.round(255 * encoded);
    }

    private static double cube(double x) {
        return x * x * x;
    }
}
