/** The threes and pairs of numbers that colours are made of. */

/** Tristimulus values X, Y, Z; Y in lx, cd m⁻², or relative to white. */
export type Xyz = [X: number, Y: number, Z: number];

/** Chromaticity coordinates x and y of the CIE 1931 diagram. */
export type Chromaticity = [x: number, y: number];

/** Red, green and blue of sRGB, linear or encoded as the function says; 0 to 1 is what a display can show. */
export type Rgb = [red: number, green: number, blue: number];
