/**
 * What a responsible tool must say beside its figures: one table for screen, print, mail and PDF.
 * `{Kar}` and `{Pka}` stand for the quantity signs; other braces are filled in by the caller.
 */
export const cautions = {
  'estimate-not-record':
    'An estimate for optimisation and review, not a dosimeter of record. The reading of the issued dosimeter is what counts in law.',
  'displayed-tolerance':
    'The {Kar} and {Pka} that a machine displays may lie up to 35 % from the true value (IEC 60601-2-43; from memory, to be confirmed by your physicist). Values marked † are corrected with the physicist’s factor{ofDate}.',
  'reference-point':
    '{Kar} belongs to a fixed point in space, not to the patient’s skin: skin dose may be lower or higher, and how skin reacts also depends on the patient. Skin-dose figures are estimates; the responsible physician decides on clinical follow-up.',
  'levels-are-prompts':
    'This department chose the levels as prompts for a review. Lying above one is no error; lying below is no proof of safety.',
  'groups-not-patients':
    'Reference levels and typical values describe groups of patients. They are not limits and do not judge a single case.',
  'case-mix': 'The comparison holds for the case mix and the number of cases shown, and for nothing beyond.',
  'scatter-interval':
    'The interval of a scatter estimate is about a factor of three either way. It rests on where a person stood and on the screen and garment that were really used.',
  'garment-condition':
    'Condition of the garment last confirmed {date}. Where an inspection is overdue, the estimate behind the garment counts as not confirmed.',
  'local-regulation':
    'Local regulation, the licence and the licensed medical physicist take precedence over anything shown here.',
  'practitioners-decide':
    'Licensed practitioners and a qualified medical physicist decide; this program neither diagnoses nor treats, and is not made for use during a procedure.',
  'arrange-follow-up':
    'A skin reaction is possible: arrange the follow-up now and do not wait for the review. Contact: {contact}.',
  'demo-data': 'Demo data: fictional.',
  'peer-review': 'Peer-review material: confidential.',
  'staff-private': 'A person’s exposure figures are private to that person and the physicist.',
  'data-gaps': '{count} cases are missing in this period ({share}).',
} as const satisfies Record<string, string>;

export type CautionKey = keyof typeof cautions;
export type CautionValues = Partial<Record<'ofDate' | 'date' | 'contact' | 'count' | 'share', string>>;

/** The text cut at its braces: even places are words, odd places are names to fill in. */
export const splitCaution = (key: CautionKey): string[] => cautions[key].split(/[{}]/);

/** The caution as plain text, for mail and print. A name that is not given leaves nothing behind. */
export function writeCaution(key: CautionKey, values: CautionValues = {}): string {
  const signs = { Kar: 'Ka,r', Pka: 'PKA', ...values };
  return splitCaution(key)
    .map((part, place) => (place % 2 === 0 ? part : (signs[part as keyof typeof signs] ?? '')))
    .join('');
}
