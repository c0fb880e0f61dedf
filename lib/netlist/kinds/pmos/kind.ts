import type { Kind } from '../kind';
import { pmosDeck } from './deck';
import { pmosEngine } from './engine';
import { pmosSymbol } from './symbol';

export const pmosKind: Kind = {
  id: 'pmos',
  title: 'MOSFET, P-channel',
  family: 'Switch',
  letter: 'Q',
  pins: [{ name: 'G', x: -40, y: -20 }, { name: 'S', x: 20, y: -40 }, { name: 'D', x: 20, y: 40 }],
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
  symbol: pmosSymbol,
  deck: pmosDeck,
  engine: pmosEngine,
  printed: ['part', 'vds_max'],
};
