import type { Data, Processor } from 'unified';
import type {} from 'remark-parse';
import { isContainerName, isLeafName } from './block-names.ts';

type Extension = NonNullable<Data['micromarkExtensions']>[number];
type ConstructRecord = NonNullable<Extension['flow']>;
type Construct = Exclude<ConstructRecord[string], undefined | readonly unknown[]>;
type Tokenize = Construct['tokenize'];
type State = ReturnType<Tokenize>;

const colon = 58;
const longestName = 24;

/**
 * A plugin, used after remark-directive: leaves only the directives that are blocks of the book. All others, and every
 * text directive, are then never read as directives, so "C3:14 carries 12 V", times and ratios stay what they are.
 */
export function ownDirectivesOnly(this: Processor): undefined {
  const data = this.data();
  data.micromarkExtensions = (data.micromarkExtensions ?? []).map(narrow);
}

function narrow(extension: Extension): Extension {
  const constructs = extension.flow?.[colon];
  if (!Array.isArray(constructs) || extension.text?.[colon] === undefined) return extension;
  const [container, leaf] = constructs;
  if (container === undefined || leaf === undefined) return extension;
  return { flow: { [colon]: [named(container, isContainerName), named(leaf, isLeafName)] } };
}

/** The construct, tried only where the name after the colons is one of ours. */
function named(construct: Construct, isOurs: (name: string) => boolean): Construct {
  const tokenize: Tokenize = function (effects, ok, nok) {
    const begin = construct.tokenize.call(this, effects, ok, nok);
    return effects.check({ partial: true, tokenize: nameOf(isOurs) }, begin, nok);
  };
  return { ...construct, tokenize };
}

/** Reads colons and a name, and looks whether the name is ours and ends there. */
function nameOf(isOurs: (name: string) => boolean): Tokenize {
  return function (effects, ok, nok) {
    let name = '';
    const start: State = (code) => {
      effects.enter('data');
      return colons(code);
    };
    const colons: State = (code) => {
      if (code === colon) {
        effects.consume(code);
        return colons;
      }
      return letters(code);
    };
    const letters: State = (code) => {
      if (code !== null && code >= 97 && code <= 122 && name.length < longestName) {
        name += String.fromCharCode(code);
        effects.consume(code);
        return letters;
      }
      effects.exit('data');
      // A name goes on with digits, hyphens, capitals: `checks-later` is another one.
      const isWhole = code === null || code < 0 || ' {['.includes(String.fromCharCode(code));
      return isWhole && isOurs(name) ? ok(code) : nok(code);
    };
    return start;
  };
}
