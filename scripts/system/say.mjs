/** Says one line of progress. */
export const say = (line) => console.log(line)

/** Stops with a sentence instead of a stack. */
export function giveUp(sentence, code = 1) {
  console.error(sentence)
  process.exit(code)
}
