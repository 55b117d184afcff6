import type { LinearRgb } from './contrast';

type Matrix = readonly [LinearRgb, LinearRgb, LinearRgb];

/**
 * What eyes see that lack one kind of cone: G. M. Machado, M. M. Oliveira, L. A. F. Fernandes, "A physiologically-based
 * model for simulation of color vision deficiency", IEEE TVCG 15(6), 2009, severity 1.0; applied to linear light.
 */
export const VISIONS: Record<'usual' | 'protanopia' | 'deuteranopia' | 'tritanopia', Matrix> = {
  usual: [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  protanopia: [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  deuteranopia: [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  tritanopia: [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
};
export type Vision = keyof typeof VISIONS;

const dot = (row: LinearRgb, colour: LinearRgb): number => row[0] * colour[0] + row[1] * colour[1] + row[2] * colour[2];

const times = (matrix: Matrix, colour: LinearRgb): LinearRgb => [
  dot(matrix[0], colour),
  dot(matrix[1], colour),
  dot(matrix[2], colour),
];

const clipped = (colour: LinearRgb): LinearRgb => {
  const clip = (light: number) => Math.min(1, Math.max(0, light));
  return [clip(colour[0]), clip(colour[1]), clip(colour[2])];
};

/** The colour as such eyes see it. */
export const seenBy = (vision: Vision, colour: LinearRgb): LinearRgb => clipped(times(VISIONS[vision], colour));

// B. Ottosson, "A perceptual color space for image processing", 2020 (OKLab).
const TO_CONES: Matrix = [
  [0.4122214708, 0.5363325363, 0.0514459929],
  [0.2119034982, 0.6806995451, 0.1073969566],
  [0.0883024619, 0.2817188376, 0.6299787005],
];
const TO_LAB: Matrix = [
  [0.2104542553, 0.793617785, -0.0040720468],
  [1.9779984951, -2.428592205, 0.4505937099],
  [0.0259040371, 0.7827717662, -0.808675766],
];

/** A colour in OKLab: lightness 0 to 1, green to red, blue to yellow. */
export const okLab = (colour: LinearRgb): LinearRgb => {
  const [long, medium, short] = times(TO_CONES, colour);
  return times(TO_LAB, [Math.cbrt(long), Math.cbrt(medium), Math.cbrt(short)]);
};

/** How far two colours look apart for such eyes: distance in OKLab; 0.02 is about the least anybody notices. */
export const seenDifference = (vision: Vision, one: LinearRgb, other: LinearRgb): number => {
  const [a, b] = [okLab(seenBy(vision, one)), okLab(seenBy(vision, other))];
  return Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
};
