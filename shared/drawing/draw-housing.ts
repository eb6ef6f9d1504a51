import { element, type Drawing } from './drawing.ts';
import type { FacePlan, HousingPlan } from './face-plan.ts';

const outline = { 'stroke-width': 2 };
const fine = { 'stroke-width': 1 };

/** The housing: its wall, its latch, on a ring a mark at its centre. Dashed while the numbering is in doubt. */
export function drawHousing({ housing, latch }: FacePlan, oriented: boolean): readonly Drawing[] {
  const dashes = oriented ? undefined : '7 4';
  return [
    ...(latch === null ? [] : drawLatch(housing, latch)),
    shape(housing, 0, { class: 'housing', ...outline, 'stroke-dasharray': dashes }),
    ...(housing.round ? [centreMark(housing)] : []),
  ];
}

function shape(
  { round, x, y, width, height }: HousingPlan,
  inset: number,
  attributes: Readonly<Record<string, string | number | undefined>>,
): Drawing {
  return round
    ? element('circle', { cx: x + width / 2, cy: y + height / 2, r: width / 2 - inset, ...attributes })
    : element('rect', { x: x + inset, y: y + inset, width: width - inset * 2, height: height - inset * 2, rx: 5, ...attributes });
}

/** A small cross in the middle of a ring, as on a drawing of a flange. */
function centreMark(housing: HousingPlan): Drawing {
  const centre = { x: housing.x + housing.width / 2, y: housing.y + housing.height / 2 };
  const arm = 7;
  return element('path', {
    class: 'centre-mark',
    d: `M${centre.x - arm} ${centre.y}h${arm * 2}M${centre.x} ${centre.y - arm}v${arm * 2}`,
    ...fine,
  });
}

/**
 * The latch: a tongue that stands out of its side, ribbed for the thumb. It is drawn for the top and turned to its side.
 */
function drawLatch(housing: HousingPlan, latch: NonNullable<FacePlan['latch']>): readonly Drawing[] {
  const { x, y, width, height } = housing;
  const isUpright = latch === 'top' || latch === 'bottom';
  const half = Math.min(26, (isUpright ? width : height) / 2 - 8);
  const out = 12;
  const middle = { x: x + width / 2, y: y + height / 2 };
  const turns: Readonly<Record<typeof latch, string>> = {
    top: `translate(${middle.x} ${y})`,
    bottom: `translate(${middle.x} ${y + height}) rotate(180)`,
    left: `translate(${x} ${middle.y}) rotate(-90)`,
    right: `translate(${x + width} ${middle.y}) rotate(90)`,
  };
  const ribs = [-0.5, 0, 0.5].map((at) => `M${Math.round(at * half)} ${-out + 3.5}v${out - 6}`).join('');
  return [
    element(
      'g',
      { class: 'latch', transform: turns[latch] },
      element('path', { d: `M${-half} 0v${-out + 4}q0 -4 4 -4h${half * 2 - 8}q4 0 4 4v${out - 4}`, ...outline }),
      element('path', { d: ribs }),
    ),
  ];
}
