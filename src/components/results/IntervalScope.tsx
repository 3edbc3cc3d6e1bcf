/** What the intervals do and do not cover; stands beside figures wherever they are shown. */
export function IntervalScope() {
  return (
    <p>
      Every interval says where the figure would lie if other listeners like these had come, with the same
      specimens, tips, tracks and playback chain. It does not cover another specimen, another fit, other music
      or another chain: one specimen stands for its model, and the listeners were not drawn at random.
    </p>
  )
}
