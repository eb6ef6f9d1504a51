/** Words that a question is built with and that no line is found by. Names of several words are read before they are dropped. */
export const fillerWords: ReadonlySet<string> = new Set(
  `a an the my your this that these those it its i me we you is are was were be been do does did has have had can could
  should would will what where which who whose when why how find show tell give want need look looking get got please of
  on in at to for from by with and or as into onto out off up not go goes going gone come comes run runs lead leads
  connect connects connected connecting join joined wire wires wired wiring cable cables line lines lead connector
  connectors plug plugs socket sockets pinout pinouts pin pins cavity cavities terminal colour color colours colors
  coloured colored code codes stripe striped tracer side face end between there use used using about any all
  one something somebody circuit`.split(/\s+/),
);
