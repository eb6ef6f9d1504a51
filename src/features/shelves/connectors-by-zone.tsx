import type { ReactElement } from 'react';
import { Link } from 'react-router';
import type { SubjectView } from '../../../shared/contracts/views.ts';
import type { SubjectAddress } from '../../../shared/pages/address.ts';
import { FaceThumbnail } from '../../blocks/face-thumbnail.tsx';
import { counted } from '../../blocks/words.ts';
import { paths } from '../../lib/paths.ts';
import { BikeZones, placeAlong, zoneAnchor } from './bike-zones.tsx';

type Connector = SubjectView['connectors'][number];

interface ConnectorsByZoneProps {
  readonly subject: SubjectAddress;
  readonly connectors: readonly Connector[];
  readonly pages: SubjectView['pages'];
}

/** Every connector as a small face, under the place on the bike where one looks for it. */
export function ConnectorsByZone({ subject, connectors, pages }: ConnectorsByZoneProps): ReactElement {
  const titles = new Map(pages.map(({ page, title }) => [page, title]));
  const zones = zonesOf(connectors);
  return (
    <div className="zones">
      {subject.shelf === 'donors' ? (
        <BikeZones zones={zones.map(([zone, inZone]) => ({ zone, connectors: inZone.length }))} />
      ) : null}
      <div>
        {zones.map(([zone, inZone]) => (
          <div className="zone" key={zone}>
            <h3 className="zone-name" id={zoneAnchor(zone)}>
              {zone}
            </h3>
            <ul className="zone-connectors">
              {inZone.map((connector) => (
                <li key={`${connector.page}#${connector.id}`}>
                  <Link className="zone-connector" to={paths.line({ ...subject, page: connector.page }, connector.id)}>
                    <FaceThumbnail connector={connector} />
                    <span>
                      <span className="zone-connector-name">{connector.name}</span>
                      <span className="zone-connector-about">
                        {counted(connector.cavities, 'cavity', 'cavities')}, on{' '}
                        {titles.get(connector.page) ?? connector.page}
                      </span>
                    </span>
                  </Link>
                </li>
              ))}
            </ul>
          </div>
        ))}
      </div>
    </div>
  );
}

/** For connectors whose page does not say where on the bike they are. */
const unplaced = 'nobody has said where';

/** The connectors zone by zone, from the front of the bike to its tail; what the drawing does not know comes last. */
function zonesOf(connectors: readonly Connector[]): [string, Connector[]][] {
  const zones = new Map<string, Connector[]>();
  for (const connector of connectors) {
    const name = connector.zone ?? unplaced;
    zones.set(name, [...(zones.get(name) ?? []), connector]);
  }
  return [...zones].toSorted(([a], [b]) => placeAlong(a) - placeAlong(b));
}
