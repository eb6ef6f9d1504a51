import { describe, expect, it } from 'vitest';
import { blockOf } from '../../tests/factories/source-blocks.ts';
import { bookCautions, measuringCaution, routingCaution } from './book-cautions.ts';
import { hazardKinds, signalWords } from './block.ts';
import { hazardsNamed, hazardsOf, hazardsTouched, hazardsTouchedByLine } from './hazards.ts';

describe('hazardsNamed', () => {
  it.each([
    ['Battery', 'battery'],
    ['two batteries', 'battery'],
    ['Main fuse holder', 'battery'],
    ['main-fuse', 'battery'],
    ['Starter relay', 'starter'],
    ['start button', 'starter'],
    ['Ignition coils', 'ignition'],
    ['Pick-up', 'ignition'],
    ['pickups', 'ignition'],
    ['Kill switches', 'ignition'],
    ['Regulator/rectifier', 'charging'],
    ['the alternator', 'charging'],
    ['Fuel tap', 'fuel'],
    ['Under the tank', 'fuel'],
    ['Front brake switch', 'brakes'],
    ['BRAKE LAMPS', 'brakes'],
    ['Headlamp', 'brakes'],
    ['Indicators, left', 'brakes'],
  ])('hears in %j a hazard: %s', (words, kind) => {
    expect(hazardsNamed(words)).toEqual([kind]);
  });

  it.each(['', 'Ignition switch', 'tankard', 'restarted', 'fuse box', 'Dip beam', 'batteryless'])(
    'hears none in %j',
    (words) => {
      expect(hazardsNamed(words)).toEqual([]);
    },
  );
});

describe('hazardsTouched', () => {
  it('goes by what a component is, and by its name or, without one, its id', () => {
    const { block } = blockOf(
      'components',
      ':::components\n| Id | Kind | Name |\n| - | - | - |\n| power | battery | |\n| sparks | igniter | |\n| main-fuse | fuse | |\n| relay | relay | Start relay |\n| tank | splice | Splice 4 |\n:::',
    );
    expect(hazardsTouched(block)).toEqual(['battery', 'starter', 'ignition']);
    expect(block.lines.map((line) => hazardsTouchedByLine(block, line))).toEqual([
      ['battery'],
      ['ignition'],
      ['battery'],
      ['starter'],
      [],
    ]);
  });

  it('goes by circuits and by the name of the block, which all its lines belong to', () => {
    const { block } = blockOf(
      'connector',
      ':::connector{#plug name="Regulator plug" layout="2"}\n| Cavity | Circuit |\n| - | - |\n| 1 | Fuel pump |\n| 2 | Earth |\n:::',
    );
    expect(hazardsTouched(block)).toEqual(['charging', 'fuel']);
    expect(block.lines.map((line) => hazardsTouchedByLine(block, line))).toEqual([['charging', 'fuel'], ['charging']]);
  });

  it("goes by a switch's role, by wires' circuits and by what a check is called", () => {
    const { block: kill } = blockOf(
      'switch',
      ':::switch{#right-bar role="kill"}\n| Position | a | b |\n| - | - | - |\n:::',
    );
    const { block: wires } = blockOf(
      'wires',
      ':::wires\n| From | To | Circuit |\n| - | - | - |\n| a.1 | b.1 | Brake lamp |\n:::',
    );
    const { block: checks } = blockOf(
      'checks',
      ':::checks\n| Check | Expect |\n| - | - |\n| Pickup coil | open |\n:::',
    );
    expect(hazardsTouched(kill)).toEqual(['ignition']);
    expect(hazardsTouched(wires)).toEqual(['brakes']);
    expect(hazardsTouched(checks)).toEqual(['ignition']);
  });

  it('finds none in a caution: it is what answers a hazard', () => {
    expect(hazardsTouched(blockOf('hazard', ':::hazard{signal="danger"}\nThe battery.\n:::').block)).toEqual([]);
  });
});

describe('hazardsOf', () => {
  it('is what a caution says, and otherwise what its words name', () => {
    expect(hazardsOf(blockOf('hazard', ':::hazard{signal="warning" of="fuel"}\nThe battery.\n:::').block)).toEqual([
      'fuel',
    ]);
    expect(
      hazardsOf(blockOf('hazard', ':::hazard{signal="warning"}\nUnplug the regulator, then the battery.\n:::').block),
    ).toEqual(['battery', 'charging']);
  });
});

describe("the book's own cautions", () => {
  it('cover every hazard, with a signal word of ANSI Z535.6, and defer to those who know better', () => {
    for (const { signal, text } of [
      ...hazardKinds.map((kind) => bookCautions[kind]),
      measuringCaution,
      routingCaution,
    ]) {
      expect(signalWords).toContain(signal);
      expect(text).toMatch(/maker's manual, local law and licensed practice/);
    }
  });

  /* What design section 15 says must be said somewhere a reader meets it. */
  it.each([
    [
      'battery',
      [/earthed lead off first/, /on last/, /positive-earth/, /engine runs/, /welding/, /below freezing/, /swollen/],
    ],
    ['starter', [/neutral/, /stand/, /sleeves/, /bridging/i, /interlock/]],
    ['ignition', [/thousands of volts/, /hundreds/, /can fire/, /earthed/, /vapour/, /kill wire/]],
    ['charging', [/50 V/, /before the engine starts/, /burn skin/]],
    ['fuel', [/No sparks/, /no heat/, /no probe/, /moving air/]],
    ['brakes', [/both brake switches/, /every lamp/, /local law/]],
  ] as const)('of %s leave nothing out', (kind, sayings) => {
    for (const saying of sayings) expect(bookCautions[kind].text).toMatch(saying);
  });

  it('of measuring and of routing leave nothing out', () => {
    for (const saying of [/battery off/, /unit or a sensor/, /fused meter/, /never cranked/])
      expect(measuringCaution.text).toMatch(saying);
    for (const saying of [/burn a loom/, /on metal/, /full lock/, /swing-arm/, /exhaust/])
      expect(routingCaution.text).toMatch(saying);
  });
});
