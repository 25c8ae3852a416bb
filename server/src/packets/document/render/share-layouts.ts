interface FontWithLayouts {
  layoutCache?: { [word: string]: unknown }
}

/** A worker that lives for months must not keep every word it ever set. */
const MOST_WORDS = 20_000

const kept = new Map<string, NonNullable<FontWithLayouts['layoutCache']>>()

/**
 * Lets documents of one thread share how words were set in a face. Each document opens its font files anew and
 * forgets its words with them, which takes nearly half of the time of a packet. The library has no name for this, so
 * where its inner field is missing nothing is shared and nothing is lost but time.
 */
export function shareLayouts(doc: PDFKit.PDFDocument, face: string): void {
  doc.font(face)
  const font = (doc as unknown as { _font?: FontWithLayouts })._font
  if (!font?.layoutCache) return
  const words = kept.get(face)
  if (words && Object.keys(words).length < MOST_WORDS) font.layoutCache = words
  else kept.set(face, font.layoutCache)
}
