import { actionWords } from './action-words.js'
import { edges, type Edge } from './edges.js'
import { endStates, type JobState } from './states.js'

/** A name that the diagram language takes: states are written with hyphens elsewhere. */
const node = (state: JobState): string => state.replaceAll('-', '_')

const arrows = ({ from, action, to, toWhile, roles }: Edge): string[] => {
  const words = `${actionWords[action]} (${roles.join(', ')})`
  const ends = toWhile === undefined ? [to] : [to, toWhile.to]
  return from.flatMap((state) => ends.map((end) => `  ${node(state)} --> ${node(end)}: ${words}`))
}

/** The edges as a Mermaid state diagram, so that the picture in the documents cannot differ from the rules. */
export function workflowDiagram(): string {
  return [
    'stateDiagram-v2',
    '  [*] --> draft',
    ...edges.flatMap(arrows),
    ...endStates.map((state) => `  ${node(state)} --> [*]`),
    '',
  ].join('\n')
}
