/** Left, top, right, bottom in points, from the upper left corner of the page turned upright. */
export type Box = readonly [left: number, top: number, right: number, bottom: number];

export interface Word {
  readonly text: string;
  readonly box: Box;
  /** 0 to 1: how sure the reader is of the letters. A text layer that agrees with the picture gives 1. */
  readonly confidence: number;
}

/** What is on a page and is not text. */
export interface Mark {
  /** `stroke` is a line drawn by hand, `picture` an image or a stamp, `rule` a straight line of a form or table. */
  readonly kind: 'stroke' | 'picture' | 'rule';
  readonly box: Box;
}

/** Text that a person looking at the page cannot see. */
export interface HiddenText {
  readonly text: string;
  readonly box: Box;
  readonly why: 'colour' | 'size' | 'covered' | 'outside' | 'invisible';
}

/**
 * Where a page was straightened before it was read: carries a point of the straightened page to the page as a viewer
 * shows it, `turned` and `width` × `height` points large. Nine numbers row by row: (x', y') / w'.
 */
export interface AsFiled {
  readonly width: number;
  readonly height: number;
  readonly projection: readonly [number, number, number, number, number, number, number, number, number];
}

export interface Page {
  /** From 1. */
  readonly number: number;
  /** Points, turned upright. */
  readonly width: number;
  readonly height: number;
  /** Degrees the page was turned clockwise to stand upright; of a PDF in place of the turn its file asks for. */
  readonly turned: 0 | 90 | 180 | 270;
  /** Only where a scan lay askew or a photograph was taken at a slant. */
  readonly asFiled?: AsFiled;
  readonly origin: 'text_layer' | 'recognised' | 'plain_text';
  /** Only what a person can see, in no promised order. */
  readonly words: readonly Word[];
  readonly marks: readonly Mark[];
  readonly hidden: readonly HiddenText[];
}

/** A file that was opened: its pages with words in their places. */
export interface OpenedFile {
  /** Of the bytes as they came, in hexadecimal. */
  readonly sha256: string;
  readonly kind: 'digital' | 'scan' | 'photo';
  /** Whether any page's words come from optical recognition. */
  readonly recognised: boolean;
  readonly pages: readonly Page[];
}

/** Why a file could not be read: `code` is for programs, `message` for people. */
export class UnreadableFile extends Error {
  constructor(
    readonly code:
      | 'empty'
      | 'damaged'
      | 'password_needed'
      | 'wrong_password'
      | 'too_large'
      | 'too_many_pages'
      | 'not_what_its_name_says'
      | 'kind_not_supported'
      | 'took_too_long',
    message: string,
  ) {
    super(message);
  }
}
