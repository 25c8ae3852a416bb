/** What an event tells beside its kind: ids, hashes, numbers and keys. Never a name, address or other text of a person. */
export type EventFacts = Readonly<Record<string, string | number | boolean | null | readonly string[]>>
