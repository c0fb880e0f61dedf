import { circuitViewOf } from '@/lib/circuits/circuit-view';
import { liveNetlist } from '@/lib/circuits/live-netlist';
import { replaceDeck } from '@/lib/circuits/replace-deck';
import { actOf } from '@/lib/http/act-of';
import { given } from '@/lib/http/answer';
import { getDeck, putDeck } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';
import { writeDeck } from '@/lib/netlist/deck/write-deck';

const plainText = { 'content-type': 'text/plain; charset=utf-8', 'content-disposition': 'attachment; filename="circuit.cir"' };

export const GET = serve(getDeck, async ({ db, access }) => given(writeDeck((await liveNetlist(db, access)).netlist), plainText));

export const PUT = serve(putDeck, async (call) => {
  await replaceDeck(actOf(call), call.access, call.body.deck);
  return given(await circuitViewOf(call.db, call.caller, call.access.circuit));
});
