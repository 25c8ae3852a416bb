/** How schedules print the units in which a design counts. Nothing is converted: a rate is per the very unit. */
const spellings: Readonly<Record<string, readonly string[]>> = {
  ton: ['ton', 'tons', 'tn'],
  yd3: ['yd3', 'yd³', 'cuyd', 'cuyds', 'cy', 'cubicyard', 'cubicyards'],
  yd2: ['yd2', 'yd²', 'sqyd', 'sqyds', 'sy', 'squareyard', 'squareyards'],
  ft: ['ft', 'foot', 'feet', 'lf', 'lnft', 'linft', 'linearfoot', 'linearfeet'],
  each: ['each', 'ea', 'no', 'number'],
  acre: ['acre', 'acres', 'ac'],
}

const bare = (text: string): string => text.toLowerCase().replace(/[\s.^]/g, '')

/** Is the unit a schedule prints the one a quantity is counted in? */
export const isSameUnit = (printed: string, counted: string): boolean =>
  (spellings[counted] ?? [counted]).includes(bare(printed))
