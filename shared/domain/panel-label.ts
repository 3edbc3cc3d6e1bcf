export type PanelLabelKey = 'none' | 'informal' | 'small-panel' | 'panel' | 'full-panel'

export interface PanelLabel {
  readonly key: PanelLabelKey
  /** As it stands on a verdict. */
  readonly words: string
  /** Fewest listeners that any shown unit had. */
  readonly fewest: number
  /** Whether any figure may be public: never on fewer than five listeners. */
  readonly publicFigures: boolean
  /** Whether the public page may carry a verdict sentence: never on an informal round. */
  readonly verdictSentence: boolean
}

/** No public figure rests on fewer than this many listeners. */
export const FEWEST_FOR_FIGURES = 5

/**
 * What a round may call its panel, by the fewest listeners that any shown unit had: under 6 informal (under 5 nothing
 * public), 6–11 small panel, 12–19 panel, 20 and more full panel.
 *
 * @param listeners for each shown unit, how many people gave it a score
 * @example
 * panelLabel([14, 14, 11]).words // => 'Small panel'
 */
export function panelLabel(listeners: readonly number[]): PanelLabel {
  const fewest = listeners.length === 0 ? 0 : Math.min(...listeners)
  const { key, words } = named(fewest)
  return {
    key,
    words,
    fewest,
    publicFigures: fewest >= FEWEST_FOR_FIGURES,
    verdictSentence: fewest >= 6,
  }
}

function named(fewest: number): { key: PanelLabelKey; words: string } {
  if (fewest < FEWEST_FOR_FIGURES) return { key: 'none', words: 'Informal' }
  if (fewest < 6) return { key: 'informal', words: 'Informal' }
  if (fewest < 12) return { key: 'small-panel', words: 'Small panel' }
  if (fewest < 20) return { key: 'panel', words: 'Panel' }
  return { key: 'full-panel', words: 'Full panel' }
}
