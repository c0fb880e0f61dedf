'use client';
import { useRouter } from 'next/navigation';
import { useRef, useState, type FormEvent } from 'react';
import { ApiProblem, callApi, wordsOf } from '@/components/query/api';
import { Button } from '@/components/ui/button';
import { Radio } from '@/components/ui/choice';
import { TextField } from '@/components/ui/field';
import { Message } from '@/components/ui/message';
import { circuitSchema, maxDeckBytes } from '@/lib/schemas/circuit';
import { lineSchema } from '@/lib/schemas/text';
import { DeckListing, DeckText, type DeckRefusal } from './deck-input';

type From = 'empty' | 'deck';

interface PostFormProps {
  readonly bench: string;
  readonly from: From;
  readonly maker: string;
}

/** Posts a circuit. A deck is taken whole or not at all, and what was typed stays. */
export function PostForm({ bench, from: initial, maker }: PostFormProps) {
  const router = useRouter();
  const file = useRef<HTMLInputElement>(null);
  const [title, setTitle] = useState('');
  const [titleWrong, setTitleWrong] = useState<string | null>(null);
  const [from, setFrom] = useState<From>(initial);
  const [deck, setDeck] = useState('');
  const [refusal, setRefusal] = useState<DeckRefusal | null>(null);
  const [listed, setListed] = useState(false);
  const [failure, setFailure] = useState<{ readonly title: string; readonly detail: string } | null>(null);
  const [busy, setBusy] = useState(false);

  const change = (text: string) => { setDeck(text); setRefusal(null); setListed(false); };
  const changeLine = (text: string) => {
    if (!refusal) return;
    setDeck(deck.split('\n').map((line, index) => (index + 1 === refusal.line ? text : line)).join('\n'));
   
  };
  const readFile = async (chosen: File | undefined) => {
    if (!chosen) return;
    if (chosen.size > maxDeckBytes) {
      setFailure({ title: `${chosen.name} is too large.`, detail: 'A deck may have at most 256 KiB.' });
      return;
    }
    change(await chosen.text());
    if (title === '') setTitle(chosen.name.replace(/\.[a-z]{2,4}$/iu, ''));
  };

  const submit = async (event: FormEvent) => {
    event.preventDefault();
    const named = lineSchema.safeParse(title);
    setTitleWrong(named.success ? null : named.error.issues[0]?.message ?? null);
    if (from === 'deck' && deck.trim() === '') setFailure({ title: 'There is no deck yet.', detail: 'Paste one or choose a file, or post an empty sheet.' });
    if (!named.success || (from === 'deck' && deck.trim() === '') || busy) return;
    setBusy(true);
    setFailure(null);
    setRefusal(null);
    try {
      const circuit = await callApi(`/api/benches/${bench}/circuits`, { method: 'POST', body: { title: named.data, ...(from === 'deck' ? { deck } : {}) }, answer: circuitSchema });
      router.push(`/circuits/${circuit.id}`);
    } catch (error) {
      setBusy(false);
      if (error instanceof ApiProblem && error.code === 'deck-unreadable' && error.body.line !== undefined) {
        setRefusal({ line: error.body.line, reason: error.body.reason ?? error.message });
        setListed(true);
      } else if (error instanceof ApiProblem && error.field('title')) setTitleWrong(error.field('title') ?? null);
      else setFailure(wordsOf(error));
    }
  };

  return (
    <form onSubmit={(event) => void submit(event)} className="grid grid-cols-[452px_minmax(0,1fr)] items-start gap-6 p-5 max-wide:grid-cols-1 max-tablet:p-0">
      <div className="border-[1.5px] border-ink bg-film text-ink max-tablet:border-x-0 max-tablet:border-t-0">
        <div className="p-3.5"><TextField label="Title, what it does" value={title} onChange={(event) => setTitle(event.target.value)} error={titleWrong} maxLength={120} autoFocus placeholder="Solder-pot heater, 24 V" /></div>
        <fieldset>
          <legend className="sr-only">Start from</legend>
          {([['empty', 'Empty sheet', 'Draw it yourself.'], ['deck', 'From a deck', 'A SPICE netlist: parts are placed and wired, fact lines *@ carry the ratings.']] as const).map(([value, words, more]) => (
            <Radio key={value} name="from" checked={from === value} onChange={() => setFrom(value)} className={`border-t border-rule px-3.5 py-2.5 ${from === value ? 'bg-act-wash shadow-[inset_4px_0_0_var(--act)]' : ''}`}>
              <span className="block text-body font-semibold">{words}</span><span className="text-sm text-ink-2">{more}</span>
            </Radio>
          ))}
        </fieldset>
        <div className="border-t border-ink p-3.5 text-md"><p className="silk mb-1 text-ink-2">Maker</p>{maker}. Co-makers are named on the circuit.</div>
        <div className="space-y-3 border-t border-ink p-3.5">
          {failure ? <Message tone="stop" title={failure.title}>{failure.detail}</Message> : null}
          <div className="flex flex-wrap items-center gap-x-3 gap-y-2">
            <Button type="submit" tone="primary" size="large" busy={busy}>Post</Button>
            <p className="min-w-0 flex-1 text-sm text-ink-2">{refusal ? `Line ${refusal.line} cannot be read. Nothing is posted until the whole deck reads.` : 'Everybody on the bench can read it and write in its margin.'}</p>
          </div>
        </div>
      </div>
      {from === 'deck' ? (
        <div className="border-[1.5px] border-ink bg-film text-ink max-tablet:border-x-0">
          <div className="flex h-[38px] items-center gap-2 border-b-[1.5px] border-ink px-3 max-tablet:h-[54px]">
            <h2 className="silk text-sm">Deck</h2>
            <span className="text-sm text-ink-2">{deck === '' ? 'paste it here' : `${deck.split('\n').length} lines`}</span>
            <input ref={file} type="file" accept=".cir,.sp,.spice,.net,.ckt,.txt,text/plain" className="hidden" onChange={(event) => { void readFile(event.target.files?.[0]); event.target.value = ''; }} />
            <Button size="small" icon="upload" className="ml-auto" onClick={() => file.current?.click()}>From a file</Button>
          </div>
          {refusal && listed
            ? <DeckListing deck={deck} refusal={refusal} onLine={changeLine} onWhole={() => setListed(false)} />
            : <DeckText deck={deck} onChange={change} refused={refusal?.line ?? null} />}
        </div>
      ) : null}
    </form>
  );
}
