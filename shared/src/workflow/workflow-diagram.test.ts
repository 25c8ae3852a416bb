import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { edges } from './edges.js'
import { jobStates } from './states.js'
import { workflowDiagram } from './workflow-diagram.js'

const document = new URL('../../docs/workflow.md', import.meta.url)

describe('the diagram of the workflow', () => {
  it('in the documents is the one that the edges give', () => {
    const drawn = /```mermaid\n([\s\S]*?)```/.exec(readFileSync(document, 'utf8'))?.[1]
    expect(drawn).toBe(workflowDiagram())
  })

  it('draws every edge from every state it begins at, and names every state', () => {
    const diagram = workflowDiagram()
    const count = edges.reduce((sum, { from, toWhile }) => sum + from.length * (toWhile ? 2 : 1), 0)
    expect(diagram.match(/ --> \w+: /g)).toHaveLength(count)
    for (const state of jobStates) expect(diagram).toContain(state.replaceAll('-', '_'))
  })
})
