import type { Vec2 } from '../../../core/geometry/vector.ts';
import type { Member } from '../../../core/project/model.ts';

/**
 * The outline of a member about its middle, anticlockwise in [across, along the depth], mm. Thicknesses that
 * the project does not give are those of ordinary sections of the size, for drawing only.
 */
export function memberOutline(member: Member): readonly Vec2[] {
  const h = member.depth / 2;
  const w = member.width / 2;
  switch (member.shape) {
    case 'tube':
      return [
        [-w, -h],
        [w, -h],
        [w, h],
        [-w, h],
      ];
    case 'I': {
      const flange = Math.min(h, member.flange ?? thickness(member.depth, 0.05, 6, 24));
      const web = Math.min(w, (member.web ?? thickness(member.depth, 0.03, 5, 16)) / 2);
      return [
        [-w, -h],
        [w, -h],
        [w, -h + flange],
        [web, -h + flange],
        [web, h - flange],
        [w, h - flange],
        [w, h],
        [-w, h],
        [-w, h - flange],
        [-web, h - flange],
        [-web, -h + flange],
        [-w, -h + flange],
      ];
    }
    case 'channel': {
      const t = Math.min(h, 2 * w, thickness(member.depth, 0.04, 4, 16));
      return [
        [-w, -h],
        [w, -h],
        [w, -h + t],
        [-w + t, -h + t],
        [-w + t, h - t],
        [w, h - t],
        [w, h],
        [-w, h],
      ];
    }
    case 'zed': {
      const t = Math.min(h, w, member.web ?? thickness(member.depth, 0.015, 3, 6));
      // The web stands in the middle; the lower flange points one way and the upper the other.
      return [
        [-t / 2, -h],
        [w, -h],
        [w, -h + t],
        [t / 2, -h + t],
        [t / 2, h],
        [-w, h],
        [-w, h - t],
        [-t / 2, h - t],
      ];
    }
    default:
      return member.shape satisfies never;
  }
}

function thickness(depth: number, part: number, least: number, most: number): number {
  return Math.min(most, Math.max(least, depth * part));
}
