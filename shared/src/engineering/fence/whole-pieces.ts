/**
 * Pieces needed to cover a length: ceil(length/piece − 1e-9). The small step keeps 100/25 at 4 when the length
 * comes out of a square root; a length greater than 0 takes at least one piece all the same.
 *
 * @example wholePieces(106.066, 25) // 5
 */
export const wholePieces = (length: number, piece: number): number =>
  Math.max(length > 0 ? 1 : 0, Math.ceil(length / piece - 1e-9))
