import type { Kind } from '../kind';
import { nmosDeck } from './deck';
import { nmosEngine } from './engine';
import { nmosSymbol } from './symbol';

export const nmosKind: Kind = {
  id: 'nmos',
  title: 'MOSFET, N-channel',
  family: 'Switch',
  letter: 'Q',
  pins: [{ name: 'G', x: -40, y: 20 }, { name: 'D', x: 20, y: -40 }, { name: 'S', x: 20, y: 40 }],
  fields: [
    { fact: 'part' }, { fact: 'package' },
    { fact: 'vds_max', rating: true }, { fact: 'vgs_max', rating: true }, { fact: 'id_max', rating: true },
    { fact: 'vth_min', rating: true }, { fact: 'vth_typ' }, { fact: 'vth_max', rating: true },
    { fact: 'rds_on', rating: true }, { fact: 'rds_on_spec_vgs', rating: true },
    { fact: 'qg' }, { fact: 'qgd' }, { fact: 'v_plateau' }, { fact: 'gfs' }, { fact: 'igss' },
    { fact: 'ciss' }, { fact: 'coss' }, { fact: 'crss' }, { fact: 'e_as' }, { fact: 'vsd' },
    { fact: 'rth_ja' }, { fact: 'rth_jc' }, { fact: 'tj_max' },
  ],
  defaults: {},
  symbol: nmosSymbol,
  deck: nmosDeck,
  engine: nmosEngine,
  printed: ['part', 'vds_max'],
};
