/** Invented listeners of the demo’s panel who need no account; none is a real person. */
export const guests = [
  'Aled Marsh',
  'Birte Quill',
  'Cosmo Vane',
  'Dunya Reed',
  'Eskil Thorn',
  'Fenna Gale',
  'Goran Slip',
  'Hedda Buoy',
  'Ivo Tarn',
  'Jorun Keel',
  'Kerensa Lugg',
] as const
