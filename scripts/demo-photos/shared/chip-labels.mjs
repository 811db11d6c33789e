/** Invented markings of chips: a type and a date code. */
export const chipLabels = [
  ['SU 2140', '0716'],
  ['HB 53', '1022'],
  ['KL 8810', '0938'],
  ['OS 77', '1203'],
  ['MD 402', '0650'],
];
