import type { ModelCard } from '../netlist';
import type { DeckNotice } from './deck-document';
import type { DeckLine } from './deck-lines';
import { DeckRefusal } from './deck-refusal';
import { modelFlags, modelParameters, mosfetLevels } from './known-parameters';
import { checkName } from './names';
import { splitPairs, type Numbers } from './statement';
import { tokensOf } from './tokens';

/**
 * Reads a `.model` card. Parameters that the engine does not know are left out with a notice, as is a whole card of an unknown
 * type or level (undefined is answered then).
 */
export function readModel({ text, line }: DeckLine, numbers: Numbers, notices: DeckNotice[]): ModelCard | undefined {
  const { words, pairs } = splitPairs(tokensOf(text, line), line);
  const [, name, type, ...rest] = words.filter((token) => token.kind === 'word').map((token) => token.text);
  if (name === undefined || type === undefined) throw new DeckRefusal(line, 'A .model line takes a name and a type.');
  checkName(name, 'The model', line);
  const known = Object.hasOwn(modelParameters, type.toLowerCase()) ? modelParameters[type.toLowerCase()] : undefined;
  if (!known) return leftOut(notices, line, `Model ${name}: the type ${type} is not known, the card is left out.`);
  const params: Record<string, number> = {};
  for (const { key, value } of pairs) {
    if (known.has(key)) params[key] = numbers.read(value, line);
    else notices.push({ line, text: `Model ${name}: the parameter ${key} is not known and left out.` });
  }
  if (/^[np]mos$/i.test(type) && !mosfetLevels.has(params.level ?? 1)) {
    return leftOut(notices, line, `Model ${name}: level ${params.level} is not read, the card is left out.`);
  }
  const flags = rest.map((word) => word.toLowerCase());
  for (const flag of flags) if (!modelFlags.has(flag)) throw new DeckRefusal(line, `Model ${name}: ${flag} is not understood.`);
  return { name, type: type.toLowerCase(), params, flags };
}

function leftOut(notices: DeckNotice[], line: number, text: string): undefined {
  notices.push({ line, text });
  return undefined;
}
