import type { ReactElement } from 'react';
import { counted } from '../../blocks/words.ts';
import { dayOf } from '../../lib/dates.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import type { KeptText } from './kept-texts.ts';

interface KeptOffersProps {
  readonly offers: readonly KeptText[];
  readonly onTakeBack: (text: KeptText) => void;
  readonly onThrowAway: (id: string) => void;
}

/** Gives back what was typed before and never sent. */
export function KeptOffers({ offers, onTakeBack, onThrowAway }: KeptOffersProps): ReactElement | null {
  if (offers.length === 0) return null;
  return (
    <div className="form">
      {offers.map((text) => (
        <Notice key={text.id} look="hint" title={`A text of yours of ${dayOf(text.keptAt)} was not sent`}>
          <p>
            This browser kept it: {counted(text.markdown.split('\n').length, 'line')}
            {text.summary === '' ? '' : `, “${text.summary}”`}. Taking it back puts it in the place of what stands
            below.
          </p>
          <p className="button-row">
            <Button type="button" onClick={() => onTakeBack(text)}>
              Take it back
            </Button>
            <Button type="button" onClick={() => onThrowAway(text.id)}>
              Throw it away
            </Button>
          </p>
        </Notice>
      ))}
    </div>
  );
}
