import type { DeckNotice } from './deck-document';
import { deckLimits } from './deck-limits';
import type { DeckLine } from './deck-lines';
import { DeckRefusal } from './deck-refusal';
import { DeckScope } from './deck-scope';
import { checkName, nameKey } from './names';
import { readElement } from './read-element';
import { readModel } from './read-model';
import { Numbers, splitPairs } from './statement';
import { tokensOf, type Token } from './tokens';

/** Statements that mean nothing to a check. */
const skipped: ReadonlySet<string> = new Set([
  '.op', '.tran', '.ac', '.dc', '.meas', '.measure', '.save', '.print', '.plot', '.probe', '.ic', '.nodeset', '.width', '.title',
  '.noise', '.four', '.tf', '.sens', '.pz', '.disto', '.backanno',
]);

const advice: Readonly<Record<string, string>> = {
  '.include': 'Other files are not read; paste the models that the deck needs into it.',
  '.inc': 'Other files are not read; paste the models that the deck needs into it.',
  '.lib': 'Libraries are not read; paste the models that the deck needs into it.',
  '.control': 'Commands are not run; leave the .control block out.',
};

/** Reads statements in three rounds over the same list: parameters, then everything with a dot, then elements. */
export class StatementReader {
  readonly notices: DeckNotice[] = [];
  readonly params = new Map<string, number>();
  readonly options: Record<string, number> = {};
  readonly root = new DeckScope('', [], 1, undefined);
  temp: number | undefined;
  private scope = this.root;
  private inControl = false;
  private readonly numbers = new Numbers(this.params);

  /** First round: `.param name=number`, of the top level as everywhere else. */
  readParam({ text, line }: DeckLine): void {
    if (word(text) !== '.param') return;
    const { words, pairs } = splitPairs(tokensOf(text, line), line);
    if (words.length > 1 || pairs.length === 0) throw new DeckRefusal(line, 'A .param line takes name=number; expressions are not read.');
    for (const { key, value } of pairs) this.params.set(key, this.numbers.read(value, line));
  }

  /** Second round: all other statements with a dot. Elements are put aside in their scope. */
  readStatement(statement: DeckLine): void {
    const { text, line } = statement;
    const head = word(text);
    if (this.inControl) {
      this.inControl = head !== '.endc';
      return;
    }
    if (!head.startsWith('.')) this.scope.pending.push(statement);
    else if (head === '.model') this.addModel(statement);
    else if (head === '.subckt') this.open(text, line);
    else if (head === '.ends') this.close(line);
    else if (head === '.temp') this.temp = this.readTemperature(text, line);
    else if (head === '.options' || head === '.option') this.readOptions(text, line);
    else if (head === '.param') this.checkParamPlace(line);
    else if (skipped.has(head)) this.notices.push({ line, text: `${head} is skipped: the check runs its own analyses.` });
    else if (head !== '.end') {
      this.inControl = head === '.control';
      throw new DeckRefusal(line, advice[head] ?? `${head} is not read.`);
    }
  }

  /** Third round: elements of the scope and of all inside it. Answers each refusal to `refuse` and goes on. */
  readElements(refuse: (error: unknown) => void, scope: DeckScope = this.root): void {
    for (const statement of scope.pending) {
      try {
        const context = { numbers: this.numbers, notices: this.notices, model: (key: string) => scope.model(key) };
        scope.elements.push(readElement(statement, context));
      } catch (error) {
        refuse(error);
      }
    }
    for (const inner of scope.inside) this.readElements(refuse, inner);
  }

  /** Throws when a `.subckt` has no `.ends`. */
  checkClosed(): void {
    if (this.scope !== this.root) throw new DeckRefusal(this.scope.line, `.subckt ${this.scope.name} has no .ends.`);
  }

  private addModel(statement: DeckLine): void {
    const card = readModel(statement, this.numbers, this.notices);
    if (!card) return;
    const key = nameKey(card.name);
    if (this.scope.models.has(key)) throw new DeckRefusal(statement.line, `The model ${card.name} stands twice.`);
    this.scope.models.set(key, card);
  }

  private open(text: string, line: number): void {
    const tokens = tokensOf(text, line);
    if (tokens.some(({ kind }) => kind !== 'word') || tokens.some((token) => nameKey(token.text) === 'params:')) {
      throw new DeckRefusal(line, 'Parameters of a subcircuit are not read; put the numbers into it.');
    }
    const [, name, ...pins] = tokens.map((token: Token) => token.text);
    if (name === undefined || pins.length === 0) throw new DeckRefusal(line, '.subckt takes a name and its pins.');
    checkName(name, 'The subcircuit', line);
    if (this.scope.hasInside(name)) throw new DeckRefusal(line, `The subcircuit ${name} stands twice.`);
    const inner = new DeckScope(name, pins, line, this.scope);
    if (inner.depth > deckLimits.depth) throw new DeckRefusal(line, `Subcircuits stand more than ${deckLimits.depth} deep.`);
    this.scope.inside.push(inner);
    this.scope = inner;
  }

  private close(line: number): void {
    if (!this.scope.parent) throw new DeckRefusal(line, '.ends has no .subckt.');
    this.scope = this.scope.parent;
  }

  private checkParamPlace(line: number): void {
    if (this.scope !== this.root) throw new DeckRefusal(line, 'A .param inside a subcircuit is not read; put the numbers in its place.');
  }

  private readTemperature(text: string, line: number): number {
    const value = tokensOf(text, line)[1];
    if (!value) throw new DeckRefusal(line, '.temp takes a temperature in °C.');
    return this.numbers.read(value, line);
  }

  private readOptions(text: string, line: number): void {
    const { words, pairs } = splitPairs(tokensOf(text, line), line);
    for (const { text: flag } of words.slice(1)) this.notices.push({ line, text: `The option ${flag} is skipped.` });
    for (const { key, value } of pairs) {
      const number = this.numbers.tryRead(value, line);
      if (number === undefined) this.notices.push({ line, text: `The option ${key} is skipped.` });
      else this.options[key] = number;
    }
    this.temp = this.options.temp ?? this.temp;
  }
}

function word(text: string): string {
  return (/^\S*/.exec(text)?.[0] ?? '').toLowerCase();
}
