import { canonicalJson } from './canonical-json.js'

describe('canonicalJson', () => {
  it('gives one text whatever order the keys were written in', () => {
    expect(canonicalJson({ b: [1, { d: null, c: 'x' }], a: true })).toBe(
      '{"a":true,"b":[1,{"c":"x","d":null}]}',
    )
    expect(canonicalJson({ a: true, b: [1, { c: 'x', d: null }] })).toBe(
      '{"a":true,"b":[1,{"c":"x","d":null}]}',
    )
  })

  it('leaves out what is undefined, as JSON does', () => {
    expect(canonicalJson({ a: undefined, b: 1 })).toBe('{"b":1}')
  })
})
