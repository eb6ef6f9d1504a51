/*
 * What the made donors' looms are made of: connectors as motorcycles have them, with circuits that lead from one to
 * another. Invented, after the general habits of the trade.
 */

/** A cavity of a made connector: its circuit, where it leads, and its size in mm². */
export interface MadeCavity {
  readonly circuit: string;
  readonly goesTo: string;
  readonly size: string;
}

export interface MadeConnector {
  readonly id: string;
  readonly name: string;
  readonly zone: string;
  readonly layouts: readonly string[];
  readonly cavities: readonly MadeCavity[];
}

function connector(id: string, name: string, zone: string, layouts: string, cavities: string): MadeConnector {
  return {
    id,
    name,
    zone,
    layouts: layouts.split(' '),
    cavities: cavities.split(';').map((cavity) => {
      const [circuit = '', goesTo = '', size = '0.5'] = cavity.split('|').map((part) => part.trim());
      return { circuit, goesTo, size };
    }),
  };
}

export const frontConnectors: readonly MadeConnector[] = [
  connector(
    'headlight',
    'Headlight bucket',
    'headlight',
    '3+4 2x4 3+3',
    'Dip beam|left-bar.3|0.85;Main beam|left-bar.2|0.85;Main beam tell-tale|instruments.5;Headlamp earth|front-earth|0.85;Pilot lamp|lights-splice;Pilot lamp earth|front-earth',
  ),
  connector(
    'left-bar',
    'Left bar cluster',
    'headlight',
    '3x3 4+5 2x5',
    'Head feed|fuse-box.4|0.85;Main beam|headlight.2|0.85;Dip beam|headlight.1|0.85;Flasher output|flasher-plug.2;Left indicators|left-splice;Right indicators|right-splice;Horn button|horn.-|0.85;Cluster earth|front-earth|0.85;Clutch switch|start-relay-plug.2',
  ),
  connector(
    'right-bar',
    'Right bar cluster',
    'headlight',
    '2x3 3+4 6',
    'Kill switch feed|fuse-box.3|0.85;Ignition feed|igniter-plug.1|0.85;Start button|start-relay-plug.1;Front brake switch feed|fuse-box.5;Brake lamp|tail-plug.3;Lights feed|fuse-box.4|0.85',
  ),
  connector(
    'instruments',
    'Instrument cluster',
    'headlight',
    '2x5 4+4 3+3+3',
    'Dial lamps|lights-splice;Neutral tell-tale|neutral-plug.1;Oil pressure tell-tale|oil-plug.1;Indicator tell-tale|flasher-plug.2;Main beam tell-tale|headlight.3;Instrument feed|fuse-box.5;Instrument earth|front-earth;Rev counter|igniter-plug.6',
  ),
  connector(
    'front-signals',
    'Front indicators',
    'headlight',
    '4 2x2',
    'Left front indicator|left-splice;Left front earth|front-earth;Right front indicator|right-splice;Right front earth|front-earth',
  ),
  connector(
    'flasher-plug',
    'Flasher',
    'headlight',
    '2 3',
    'Flasher feed|fuse-box.5|0.85;Flasher output|left-bar.4|0.85',
  ),
  connector('horn-plug', 'Horn', 'headlight', '2', 'Horn feed|fuse-box.5|0.85;Horn button|left-bar.7|0.85'),
];

export const centreConnectors: readonly MadeConnector[] = [
  connector(
    'ignition-plug',
    'Ignition switch',
    'tank',
    '4 2x2 3+2',
    'Battery feed|main-fuse.out|2;Switched live|fuse-box.1|2;Park feed|tail-plug.1;Lights feed|fuse-box.4|0.85',
  ),
  connector(
    'fuse-box',
    'Fuse box',
    'left side cover',
    '2x4 5+5 8',
    'Supply|ignition-plug.2|2;Charging feed|regulator-plug.4|2;Ignition fuse|right-bar.1|0.85;Lights fuse|right-bar.6|0.85;Signals fuse|flasher-plug.1|0.85;Tail fuse|tail-plug.1;Accessory|accessory.1',
  ),
  connector(
    'start-relay-plug',
    'Starter relay',
    'left side cover',
    '2 2x2',
    'Start button|right-bar.3;Clutch switch|left-bar.9',
  ),
  connector(
    'igniter-plug',
    'Igniter',
    'right side cover',
    '2x4 6 3+4',
    'Ignition feed|right-bar.2|0.85;Pickup 1|pickup-plug.1;Pickup 2|pickup-plug.2;Coil 1|coil-left.-|0.85;Coil 2|coil-right.-|0.85;Rev counter|instruments.8;Igniter earth|frame|0.85',
  ),
  connector(
    'regulator-plug',
    'Regulator',
    'right side cover',
    '2x3 3+3',
    'Phase 1|alternator-plug.1|2;Phase 2|alternator-plug.2|2;Phase 3|alternator-plug.3|2;Charging output|fuse-box.2|2;Sense|fuse-box.3;Regulator earth|frame|2',
  ),
  connector(
    'accessory',
    'Accessory lead',
    'under the seat',
    '2',
    'Accessory feed|fuse-box.7|0.85;Accessory earth|frame|0.85',
  ),
];

export const rearConnectors: readonly MadeConnector[] = [
  connector(
    'tail-plug',
    'Tail lamp',
    'tail',
    '3+3 2x3 6',
    'Tail lamp|fuse-box.6;Number plate lamp|fuse-box.6;Brake lamp|right-bar.5|0.85;Tail earth|frame;Left rear indicator|left-splice;Right rear indicator|right-splice',
  ),
  connector(
    'rear-signals',
    'Rear indicators',
    'tail',
    '4 2x2',
    'Left rear indicator|left-splice;Left rear earth|frame;Right rear indicator|right-splice;Right rear earth|frame',
  ),
  connector(
    'alternator-plug',
    'Alternator',
    'engine left',
    '3 round 3',
    'Phase 1|regulator-plug.1|2;Phase 2|regulator-plug.2|2;Phase 3|regulator-plug.3|2',
  ),
  connector(
    'pickup-plug',
    'Pickup coils',
    'engine left',
    '2x2 4',
    'Pickup 1|igniter-plug.2;Pickup 2|igniter-plug.3;Pickup earth|igniter-plug.7',
  ),
  connector('neutral-plug', 'Neutral switch', 'engine left', '1 2', 'Neutral tell-tale|instruments.2'),
  connector('oil-plug', 'Oil pressure switch', 'engine right', '1', 'Oil pressure tell-tale|instruments.3'),
  connector(
    'rear-brake-plug',
    'Rear brake switch',
    'right side cover',
    '2',
    'Rear brake switch feed|fuse-box.5;Brake lamp|tail-plug.3',
  ),
];

/** Id, kind, name and rating. */
export const madeComponents: readonly (readonly [string, string, string, string])[] = [
  ['battery', 'battery', 'Battery', '12 V 14 Ah'],
  ['main-fuse', 'fuse', 'Main fuse', '30 A'],
  ['lights-fuse', 'fuse', 'Lights fuse', '15 A'],
  ['ignition-fuse', 'fuse', 'Ignition fuse', '10 A'],
  ['signals-fuse', 'fuse', 'Signals fuse', '10 A'],
  ['headlamp', 'load', 'Headlamp', 'dip 55 W, main 60 W'],
  ['horn', 'load', 'Horn', '30 W'],
  ['tail-lamp', 'load', 'Tail lamp', '5 W'],
  ['brake-lamp', 'load', 'Brake lamp', '21 W'],
  ['start-relay', 'relay', 'Starter relay', '12 V 4 Ω'],
  ['starter', 'starter', 'Starter motor', '0.6 kW'],
  ['alternator', 'alternator', 'Alternator', '14 V 20 A'],
  ['regulator', 'regulator', 'Regulator', ''],
  ['igniter', 'igniter', 'Igniter', ''],
  ['coil-left', 'ignition-coil', 'Left ignition coil', '3.5 Ω'],
  ['coil-right', 'ignition-coil', 'Right ignition coil', '3.5 Ω'],
  ['flasher', 'flasher', 'Flasher', '12 V 2 x 21 W'],
  ['frame', 'earth', 'Frame', ''],
  ['engine', 'earth', 'Engine', ''],
  ['front-earth', 'splice', 'Front earth eyelet', ''],
];

/** Ends of a heavy wire, its size and its length in metres. */
export const madeWires: readonly (readonly [string, string, string, string])[] = [
  ['battery.+', 'main-fuse.in', '3', '0.2'],
  ['battery.-', 'frame', '8', '0.4'],
  ['frame', 'engine', '8', '0.3'],
  ['main-fuse.out', 'ignition-plug.1', '2', '0.7'],
  ['front-earth', 'frame', '1.25', '0.3'],
  ['battery.+', 'start-relay.30', '8', '0.3'],
  ['start-relay.87', 'starter.+', '8', '0.8'],
];

/** Name, ends, expectation, temperature or speed. */
export const madeChecks: readonly (readonly [string, string, string, string])[] = [
  ['Pickup coil', 'igniter-plug.2 – igniter-plug.7', '100–130 Ω', '20 °C'],
  ['Ignition coil', 'coil-left.+ – coil-left.-', '3–4 Ω', '20 °C'],
  ['Charging', 'battery.+ – battery.-', '13.8–14.6 V', '3000 rpm'],
  ['Phase to phase', 'alternator-plug.1 – alternator-plug.2', '0.3–0.6 Ω', '20 °C'],
  ['Starter relay', 'start-relay.85 – start-relay.86', '3.5–4.5 Ω', '20 °C'],
  ['Engine strap', 'frame – engine', 'continuity', ''],
];

/** What some donors have besides: circuits that the usual ones lack, and where such a wire may end. */
export const furtherCircuits =
  `Side stand switch|Side stand tell-tale|Fuel sender|Fuel gauge|Fuel pump|Fuel tap heater|Fan switch|Fan motor|
Temperature sender|Temperature gauge|Hazard switch|Hazard feed|Passing lamp|Passing lamp earth|Clock|Clock memory|Heated grips|Reserve lamp|
Lamp failure unit|Seat lock|Choke tell-tale|Oil temperature|Gear position 1|Gear position 2|Gear position 3|Diode block|Headlamp relay coil|
Headlamp relay feed|Starter interlock|Clutch interlock|Charge lamp|Field winding|Neutral point|Speed sensor|Speed sensor earth|Speed sensor feed|
Horn relay coil|Horn relay feed|Alarm feed|Alarm earth|Luggage lamp|Sidecar plug 1|Sidecar plug 2|Sidecar plug 3|Spare lead|Test lead`
    .split('|')
    .map((circuit) => circuit.trim());

export const furtherEnds = [
  'frame',
  'front-earth',
  'signal-splice',
  'lights-splice',
  'diode-block.1',
  'diode-block.2',
  'headlamp-relay.86',
  'fan-plug.1',
  'fan-plug.2',
  'sender-plug.1',
  'sidecar-plug.1',
  'sidecar-plug.2',
  'clock.+',
  'stand-plug.1',
  'stand-plug.2',
  'sensor-plug.3',
  '',
];
