/** What can be seen on a board, in millimetres from its upper left corner. */
export interface BoardMarks {
  /** The edge as a closed path, where it is neither a rectangle nor round. */
  outline?: string;
  /** Mounting holes with their copper ring: x, y, outer diameter. */
  holes?: readonly (readonly [number, number, number])[];
  /** Solder pads: x, y. */
  pads?: readonly (readonly [number, number])[];
  /** Bare copper as a path. */
  copper?: string;
  /** Printed lines as a path. */
  silk?: string;
}
