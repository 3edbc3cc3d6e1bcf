/** What the invented units sound like: the middle of what listeners rate, 0 to 100; absent is 50 for all. */
export interface Sound {
  maker: string
  /** By the lexicon’s key. */
  heard: Readonly<Record<string, number>>
  /** How each of the two camps likes it. */
  liked: { wide: number; warm: number }
}

const sound = (
  maker: string,
  [width, warmth, brightness, bass, natural]: readonly [number, number, number, number, number],
  [wide, warm]: readonly [number, number],
): Sound => ({
  maker,
  heard: { width, warmth, brightness, 'bass-amount': bass, 'natural-tone': natural },
  liked: { wide, warm },
})

export const sounds: Readonly<Record<string, Sound>> = {
  'Tern One': sound('Saltmarsh Audio', [11, 57, 48, 60, 51], [46, 62]),
  Dunlin: sound('Lantern Reed', [92, 45, 62, 45, 60], [74, 36]),
  Whimbrel: sound('Saltmarsh Audio', [46, 92, 28, 63, 58], [50, 82]),
  Avocet: sound('Eddy & Shoal', [80, 9, 80, 34, 47], [68, 28]),
  Knot: sound('Lantern Reed', [24, 72, 37, 70, 54], [42, 80]),
  Godwit: sound('Eddy & Shoal', [60, 50, 55, 50, 63], [58, 56]),
  Fairlead: sound('Saltmarsh Audio', [44, 36, 66, 41, 45], [49, 40]),
  Capstan: sound('Eddy & Shoal', [58, 62, 44, 74, 57], [55, 66]),
}

/** A descriptor that these listeners do not agree on: everybody hears something else, whatever the unit. */
export const disputed = new Set(['depth', 'layering'])
