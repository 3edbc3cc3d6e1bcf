/** How an invented listener hears: which camp on liking, how close to what they mean, and whether at random. */
export interface Ear {
  camp: 'wide' | 'warm'
  /** Standard deviation of one rating around what they hear, in points of the scale. */
  wander: number
  /** Hardly tells units apart: the unreliable one. */
  lost?: boolean
}

const ear = (camp: Ear['camp'], wander: number): Ear => ({ camp, wander })

/** Invented listeners of the demo’s panel who need no account; none is a real person. */
export const guests: Readonly<Record<string, Ear>> = {
  'Aled Marsh': ear('wide', 4),
  'Birte Quill': ear('warm', 5),
  'Cosmo Vane': ear('wide', 5),
  'Dunya Reed': ear('wide', 3),
  'Eskil Thorn': ear('warm', 4),
  'Fenna Gale': ear('wide', 5),
  'Goran Slip': { camp: 'wide', wander: 14, lost: true },
  'Hedda Buoy': ear('wide', 4),
  'Ivo Tarn': ear('warm', 5),
  'Jorun Keel': ear('warm', 3),
  'Kerensa Lugg': ear('wide', 5),
  'Lorcan Weir': ear('wide', 5),
  'Maren Spit': ear('warm', 4),
}

/** Everybody’s ears, those who sign in included. */
export const ears: Readonly<Record<string, Ear>> = {
  ...guests,
  'Wanda Osei': ear('wide', 4),
  'Ines Falk': ear('warm', 4),
}
