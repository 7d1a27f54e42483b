/**
 * PLL letters. The table is written from memory of common practice: each letter stands beside an algorithm
 * known for it, and the case is read from that algorithm. The tests prove the 21 complete and different.
 */
export const PLL_NAMES: readonly (readonly [name: string, algorithm: string])[] = [
  ['Aa', "x R' U R' D2 R U' R' D2 R2 x'"],
  ['Ab', "x R2 D2 R U R' D2 R U' R x'"],
  ['E', "x' R U' R' D R U R' D' R U R' D R U' R' D' x"],
  ['F', "R' U' F' R U R' U' R' F R2 U' R' U' R U R' U R"],
  ['Ga', "R2 U R' U R' U' R U' R2 D U' R' U R D'"],
  ['Gb', "R' U' R U D' R2 U R' U R U' R U' R2 D"],
  ['Gc', "R2 U' R U' R U R' U R2 D' U R U' R' D"],
  ['Gd', "R U R' U' D R2 U' R U' R' U R' U R2 D'"],
  ['H', 'M2 U M2 U2 M2 U M2'],
  ['Ja', "x R2 F R F' R U2 r' U r U2 x'"],
  ['Jb', "R U R' F' R U R' U' R' F R2 U' R'"],
  ['Na', "R U R' U R U R' F' R U R' U' R' F R2 U' R' U2 R U' R'"],
  ['Nb', "R' U R U' R' F' U' F R U R' F R' F' R U' R"],
  ['Ra', "R U' R' U' R U R D R' U' R D' R' U2 R'"],
  ['Rb', "R2 F R U R U' R' F' R U2 R' U2 R"],
  ['T', "R U R' U' R' F R2 U' R' U' R U R' F'"],
  ['Ua', "M2 U M U2 M' U M2"],
  ['Ub', "M2 U' M U2 M' U' M2"],
  ['V', "R' U R' U' y R' F' R2 U' R' U R' F R F"],
  ['Y', "F R U' R' U' R U R' F' R U R' U' R' F R F'"],
  ['Z', "M' U M2 U M2 U M' U2 M2"],
];
