/** One terminal designation of DIN 72552-2. */
export interface TerminalNumber {
  readonly terminal: string;
  readonly meaning: string;
  /** `read` where the value stood in a source that was open; `memory` where it was recalled and nothing may hang on it. */
  readonly provenance: 'read' | 'memory';
}

function read(terminal: string, meaning: string): TerminalNumber {
  return { terminal, meaning, provenance: 'read' };
}

function recalled(terminal: string, meaning: string): TerminalNumber {
  return { terminal, meaning, provenance: 'memory' };
}

/**
 * Terminals by DIN 72552-2 (last edition 1971-03), as copied in pages on the standard. It numbers terminals, not wires.
 * `87` and `87a` follow the practice of ISO 7588 relays: in the standard itself 87 is the input of a changeover contact.
 */
export const terminalNumbers: readonly TerminalNumber[] = [
  read('1', 'ignition coil or distributor, low voltage'),
  read('4', 'ignition coil or distributor, high voltage'),
  read('15', 'switched positive after the battery: output of the ignition switch'),
  read('15a', 'output of the series resistor to coil and starter'),
  read('30', 'battery positive, direct'),
  read('31', 'return to battery negative or earth, direct'),
  read('31b', 'return to negative or earth through a switch or relay'),
  read('49', 'flasher unit, input'),
  read('49a', 'flasher unit, output to the indicator switch'),
  read('50', 'starter control'),
  read('53', 'wiper motor, positive input'),
  read('54', 'brake lamps'),
  read('55', 'fog lamps'),
  read('56', 'headlamp, feed'),
  read('56a', 'main beam and its tell-tale'),
  read('56b', 'dipped beam'),
  recalled('57', 'side or parking lamp of motorcycles and mopeds'),
  read('57a', 'parking lamps'),
  read('58', 'side marker and number-plate lamps'),
  read('61', 'charge indicator'),
  read('85', 'relay winding, end (negative side)'),
  read('86', 'relay winding, start (positive side)'),
  read('87', 'relay, make contact, output'),
  read('87a', 'relay, break contact, output'),
  recalled('87b', 'relay, second output paired with 87'),
  read('B+', 'battery positive at the generator'),
  read('D+', 'dynamo positive, regulator output'),
  read('DF', 'dynamo field'),
  read('L', 'direction indicators, left'),
  read('R', 'direction indicators, right'),
];
