import type { Box } from '../../page';
import type { Colour } from './drawn';
import { IDENTITY, type Matrix } from './matrix';

/** What pdf.js tells of a font that matters for where its characters stand. */
export interface FontMetrics {
  readonly isType3Font?: boolean;
  readonly vertical?: boolean;
  readonly fontMatrix?: readonly number[];
  readonly bbox?: readonly number[];
}

/** The part of PDF's graphics state that decides where and how something is seen. */
export interface GraphicsState {
  matrix: Matrix;
  clip: Box;
  fillColour: Colour;
  strokeColour: Colour;
  fillAlpha: number;
  strokeAlpha: number;
  /** Multiply and its like let through what lies beneath. */
  blends: boolean;
  lineWidth: number;
  font: FontMetrics | null;
  fontSize: number;
  charSpacing: number;
  wordSpacing: number;
  horizontalScale: number;
  leading: number;
  rise: number;
  renderMode: number;
  textMatrix: Matrix;
  x: number;
  y: number;
  lineX: number;
  lineY: number;
}

export function initialState(matrix: Matrix, page: Box): GraphicsState {
  return {
    matrix,
    clip: page,
    fillColour: [0, 0, 0],
    strokeColour: [0, 0, 0],
    fillAlpha: 1,
    strokeAlpha: 1,
    blends: false,
    lineWidth: 1,
    font: null,
    fontSize: 0,
    charSpacing: 0,
    wordSpacing: 0,
    horizontalScale: 1,
    leading: 0,
    rise: 0,
    renderMode: 0,
    textMatrix: IDENTITY,
    x: 0,
    y: 0,
    lineX: 0,
    lineY: 0,
  };
}
