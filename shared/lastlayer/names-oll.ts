/**
 * OLL numbers and shape groups. The table is written from memory of common practice: each number stands
 * beside an algorithm known for it, and the case is read from that algorithm. The tests prove the 57
 * complete and different, and check the shapes and mirror pairs against each other.
 */
export type OllGroup =
  | 'dot'
  | 'line'
  | 'L'
  | 'corners oriented'
  | 'T'
  | 'square'
  | 'C'
  | 'P'
  | 'W'
  | 'fish'
  | 'knight'
  | 'lightning'
  | 'awkward'
  | 'cross';

export const OLL_NAMES: readonly (readonly [number: number, group: OllGroup, algorithm: string])[] = [
  [1, 'dot', "R U2 R2 F R F' U2 R' F R F'"],
  [2, 'dot', "F R U R' U' F' f R U R' U' f'"],
  [3, 'dot', "f R U R' U' f' U' F R U R' U' F'"],
  [4, 'dot', "f R U R' U' f' U F R U R' U' F'"],
  [5, 'square', "r' U2 R U R' U r"],
  [6, 'square', "r U2 R' U' R U' r'"],
  [7, 'lightning', "r U R' U R U2 r'"],
  [8, 'lightning', "r' U' R U' R' U2 r"],
  [9, 'fish', "R U R' U' R' F R2 U R' U' F'"],
  [10, 'fish', "R U R' U R' F R F' R U2 R'"],
  [11, 'lightning', "r U R' U R' F R F' R U2 r'"],
  [12, 'lightning', "F R U R' U' F' U F R U R' U' F'"],
  [13, 'knight', "F U R U' R2 F' R U R U' R'"],
  [14, 'knight', "R' F R U R' F' R F U' F'"],
  [15, 'knight', "l' U' l L' U' L U l' U l"],
  [16, 'knight', "r U r' R U R' U' r U' r'"],
  [17, 'dot', "R U R' U R' F R F' U2 R' F R F'"],
  [18, 'dot', "r U R' U R U2 r2 U' R U' R' U2 r"],
  [19, 'dot', "M U R U R' U' M' R' F R F'"],
  [20, 'dot', "r U R' U' M2 U R U' R' U' M'"],
  [21, 'cross', "R U2 R' U' R U R' U' R U' R'"],
  [22, 'cross', "R U2 R2 U' R2 U' R2 U2 R"],
  [23, 'cross', "R2 D' R U2 R' D R U2 R"],
  [24, 'cross', "r U R' U' r' F R F'"],
  [25, 'cross', "F' r U R' U' r' F R"],
  [26, 'cross', "R U2 R' U' R U' R'"],
  [27, 'cross', "R U R' U R U2 R'"],
  [28, 'corners oriented', "r U R' U' M U R U' R'"],
  [29, 'awkward', "R U R' U' R U' R' F' U' F R U R'"],
  [30, 'awkward', "F R' F R2 U' R' U' R U R' F2"],
  [31, 'P', "R' U' F U R U' R' F' R"],
  [32, 'P', "L U F' U' L' U L F L'"],
  [33, 'T', "R U R' U' R' F R F'"],
  [34, 'C', "R U R2 U' R' F R U R U' F'"],
  [35, 'fish', "R U2 R2 F R F' R U2 R'"],
  [36, 'W', "L' U' L U' L' U L U L F' L' F"],
  [37, 'fish', "F R' F' R U R U' R'"],
  [38, 'W', "R U R' U R U' R' U' R' F R F'"],
  [39, 'lightning', "L F' L' U' L U F U' L'"],
  [40, 'lightning', "R' F R U R' U' F' U R"],
  [41, 'awkward', "R U R' U R U2 R' F R U R' U' F'"],
  [42, 'awkward', "R' U' R U' R' U2 R F R U R' U' F'"],
  [43, 'P', "F' U' L' U L F"],
  [44, 'P', "F U R U' R' F'"],
  [45, 'T', "F R U R' U' F'"],
  [46, 'C', "R' U' R' F R F' U R"],
  [47, 'L', "F' L' U' L U L' U' L U F"],
  [48, 'L', "F R U R' U' R U R' U' F'"],
  [49, 'L', "r U' r2 U r2 U r2 U' r"],
  [50, 'L', "r' U r2 U' r2 U' r2 U r'"],
  [51, 'line', "f R U R' U' R U R' U' f'"],
  [52, 'line', "R U R' U R U' B U' B' R'"],
  [53, 'L', "l' U2 L U L' U' L U L' U l"],
  [54, 'L', "r U2 R' U' R U R' U' R U' r'"],
  [55, 'line', "R U2 R2 U' R U' R' U2 F R F'"],
  [56, 'line', "r U r' U R U' R' U R U' R' r U' r'"],
  [57, 'corners oriented', "R U R' U' M' U R U' r'"],
];
