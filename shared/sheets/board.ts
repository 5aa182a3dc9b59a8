import { type Raster, border } from './piece-raster.ts';

/** Squared paper that remembers which cells are taken; places are cells, of a piece's box. */
export type Board = {
  readonly free: (piece: Raster, x: number, y: number) => boolean;
  /** Takes the cells of a piece, or gives them free again. */
  readonly turn: (piece: Raster, x: number, y: number) => void;
};

/** An empty board; a border of cells lies round it, where the gap of pieces at its edge may reach. */
export function emptyBoard(columns: number, rows: number): Board {
  const words = Math.ceil((columns + 2 * border) / 32) + 2;
  const cells = new Uint32Array((rows + 2 * border + 1) * words);
  const start = (y: number, row: number, x: number): number => (y + row) * words + (x >>> 5);
  return {
    free(piece, x, y) {
      const [left, shift] = [x, x & 31];
      for (const row of piece.looks) {
        const own = row * piece.words;
        const base = start(y, row, left);
        let carry = 0;
        for (let word = 0; word < piece.words; word += 1) {
          const bits = piece.bits[own + word] ?? 0;
          const moved = shift === 0 ? bits : (bits << shift) | carry;
          carry = shift === 0 ? 0 : bits >>> (32 - shift);
          if ((moved & (cells[base + word] ?? 0)) !== 0) return false;
        }
      }
      return true;
    },
    turn(piece, x, y) {
      const shift = x & 31;
      for (let row = 0; row < piece.rows; row += 1) {
        const own = row * piece.words;
        const base = start(y, row, x);
        let carry = 0;
        for (let word = 0; word < piece.words; word += 1) {
          const bits = piece.bits[own + word] ?? 0;
          const moved = shift === 0 ? bits : (bits << shift) | carry;
          carry = shift === 0 ? 0 : bits >>> (32 - shift);
          cells[base + word] = (cells[base + word] ?? 0) ^ moved;
        }
      }
    },
  };
}
