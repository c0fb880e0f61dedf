import type { Kind } from '../kind';
import { npnDeck } from './deck';
import { npnEngine } from './engine';
import { npnSymbol } from './symbol';

export const npnKind: Kind = {
  id: 'npn',
  title: 'Transistor, NPN',
  family: 'Switch',
  letter: 'Q',
  pins: [{ name: 'B', x: -40, y: 0 }, { name: 'C', x: 20, y: -40 }, { name: 'E', x: 20, y: 40 }],
  fields: [
    { fact: 'part' }, { fact: 'package' },
    { fact: 'vceo_max', rating: true }, { fact: 'vebo_max' }, { fact: 'ic_max', rating: true }, { fact: 'ib_max' },
    { fact: 'hfe_min', rating: true }, { fact: 'hfe_typ' }, { fact: 'hfe_sat' }, { fact: 'vbe' }, { fact: 'vce_sat' }, { fact: 'icbo' },
    { fact: 'rth_ja' }, { fact: 'rth_jc' }, { fact: 'tj_max' },
  ],
  defaults: {},
  symbol: npnSymbol,
  deck: npnDeck,
  engine: npnEngine,
  printed: ['part', 'vceo_max'],
};
