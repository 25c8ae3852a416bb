/** What the signers agree to. Read with the consent text of the same version. */
export const signingWords = {
  version: '2026-1',
  landowner:
    'I have read this packet. I want this work done as drawn, at the estimated cost shown, and I understand what is left for me to pay. I will not start before I am told in writing that it is approved. I will keep the work in order for its life.',
  electronic:
    'You may sign on paper or electronically. Signing electronically is your choice: you may ask for paper, and you may take your consent to electronic records back at any time before approval. The evidence page of the final packet then shows who signed, when and how.',
} as const
