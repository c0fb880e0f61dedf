import { describe, expect, it } from 'vitest';
import type { Facts } from '../netlist';
import { mosfetModel } from './mosfet-model';

const sheet: Facts = {
  vds_max: 100, vth_min: 2, vth_typ: 3, vth_max: 4, rds_on: 0.044, rds_on_spec_vgs: 10, id_max: 28, vsd: 1.2,
};

function model(facts: Facts, corner: 'min' | 'typ' | 'max' = 'typ', channel: 'n' | 'p' = 'n') {
  const result = mosfetModel(facts, channel, corner);
  if ('missing' in result) throw new Error(result.missing);
  return result;
}

it('moves the threshold with the corner and nothing is assumed on a full sheet', () => {
  const [min, typ, max] = (['min', 'typ', 'max'] as const).map((corner) => model(sheet, corner));
  expect(typ?.assumed).toEqual([]);
  expect((typ?.card.params.vto ?? 0) - (min?.card.params.vto ?? 0)).toBeCloseTo(1, 1);
  expect((max?.card.params.vto ?? 0) - (typ?.card.params.vto ?? 0)).toBeCloseTo(1, 1);
});

it('turns a P-channel round and takes its signed facts by magnitude', () => {
  const p = model({ ...sheet, vds_max: -100, vth_min: -2, vth_typ: -3, vth_max: -4, rds_on_spec_vgs: -10, id_max: -28 }, 'typ', 'p');
  expect(p.card.flags).toEqual(['pchan']);
  expect(p.card.params.vto).toBeCloseTo(-(model(sheet).card.params.vto ?? 0), 12);
});

describe('what the sheet leaves out', () => {
  it('is assumed and said', () => {
    const { assumed } = model({ vth_min: 2, vth_max: 4, rds_on: 0.044 });
    expect(assumed.map(({ fact }) => fact)).toEqual(['vth_typ', 'rds_on_spec_vgs', 'id_max', 'vsd']);
    expect(assumed[0]?.words).toContain('mean');
  });

  it('stops the model when it is the threshold or the on-resistance', () => {
    expect(mosfetModel({ rds_on: 0.044 }, 'n', 'typ')).toEqual({ missing: 'vth_typ' });
    expect(mosfetModel({ vth_max: 4 }, 'n', 'typ')).toEqual({ missing: 'rds_on' });
  });

  it('asks for the gate voltage when the on-resistance stands below the threshold', () => {
    expect(mosfetModel({ ...sheet, rds_on_spec_vgs: 2 }, 'n', 'max')).toEqual({ missing: 'rds_on_spec_vgs' });
  });
});

it('leaves avalanche to the rules', () => {
  expect(Object.keys(model(sheet).card.params)).not.toContain('bv');
});

it('carries capacitances when they are given', () => {
  const { params } = model({ ...sheet, ciss: 1960e-12, coss: 250e-12, crss: 40e-12, qg: 71e-9 }).card;
  expect(params.cgs).toBeCloseTo(1920e-12, 15);
  expect(params.cgdmax).toBeGreaterThan(40e-12);
});
