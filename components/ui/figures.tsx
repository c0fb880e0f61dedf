import { monoWords } from './mono-words';

/** Quantities in a sentence: '22 kΩ', '0.25 W', '99 %'. */
const quantity = /(\d[\d.,]*[\u2009\u00a0 ]?(?:[pnuµmkMG]?(?:Ω|V|A|W|F|H|Hz|s|C|J)\b|[pnuµmkMG]?Ω|%|°C)(?:\u2009?(?:pk|rms|DC))?)/u;

/** A sentence whose quantities stand in the mono. */
export function Figures({ children }: { readonly children: string }) {
  return children.split(quantity).map((piece, index) => (index % 2 === 1
    ? <span key={index} className="figure">{monoWords(piece)}</span>
    : piece));
}
