import { memberPlates } from '../frame/memberPlates.ts';
import type { Member } from '../project/model.ts';
import type { ResistingSection } from '../resistance/model.ts';
import { boxProperties, iProperties } from '../section/plateShapes.ts';
import { shapeProperties } from '../section/shapeProperties.ts';

/**
 * A member as resistance in compression needs it, y along its depth; null for a zed, whose walls are too thin for the rules held here.
 * A rectangular tube goes by its larger side, where its walls are most slender.
 */
export function memberResisting(member: Member): ResistingSection | null {
  const { name, shape, depth, width } = member;
  const { flange, web } = memberPlates(member);
  const common = { designation: name, rootRadius: 0, thickness: web, outstandingLeg: width } as const;
  switch (shape) {
    case 'I':
      return {
        ...common,
        shape: 'I section',
        properties: iProperties({ depth, width, web, flange }),
        connectedLeg: depth,
        thickness: flange,
        offCentroid: depth / 2,
        plates: [
          { name: 'flange', width: width / 2, thickness: flange },
          { name: 'web', width: depth - 2 * flange, thickness: web },
        ],
      };
    case 'channel': {
      const properties = shapeProperties({ kind: 'channel', depth, width, web, flange });
      return {
        ...common,
        shape: 'channel',
        properties,
        connectedLeg: depth,
        offCentroid: properties.centroidX,
        plates: [
          { name: 'flange', width, thickness: flange },
          { name: 'web', width: depth - 2 * flange, thickness: web },
        ],
      };
    }
    case 'tube':
      return {
        ...common,
        shape: 'square tube',
        properties: boxProperties(depth, width, web),
        connectedLeg: Math.max(depth, width),
        offCentroid: depth / 2,
      };
    case 'zed':
      return null;
    default:
      return shape satisfies never;
  }
}
