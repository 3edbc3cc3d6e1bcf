/** How units are called in a round's results: by name alone where that is enough, else with the maker before it. */
export function unitNames(
  units: readonly { id: string; maker: string; name: string }[],
): Map<string, string> {
  const count = new Map<string, number>()
  for (const { name } of units) count.set(name, (count.get(name) ?? 0) + 1)
  return new Map(
    units.map(({ id, maker, name }) => [id, (count.get(name) ?? 0) > 1 ? `${maker} ${name}` : name]),
  )
}
