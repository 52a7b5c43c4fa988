import { type JSX, type PointerEvent, type RefObject, useRef, useState } from 'react';
import type { Vec2, Vec3 } from '../../../core/geometry/vector.ts';
import type { UnitSystem } from '../../../core/project/model.ts';
import { showForce } from '../../../core/units/loads.ts';
import type { SheetView } from '../view/sheetView.ts';
import { draggedForce, keyedForce } from './dragForce.ts';
import type { Placing, PlacingNode } from './forcesShown.ts';

interface ForceNodesProps {
  readonly placing: Placing;
  readonly units: UnitSystem;
  /** Along the bay. */
  readonly right: Vec3;
  readonly view: RefObject<SheetView | null>;
  onForce(place: string, force: Vec3): void;
}

interface Drag {
  readonly node: string;
  readonly at: Vec2;
  readonly force: Vec3 | null;
}

/** Nodes that take a force: drag from one, or press arrow keys on it; Delete takes it away, Escape lets go. */
export function ForceNodes({ placing, units, right, view, onForce }: ForceNodesProps): JSX.Element {
  const [drag, setDrag] = useState<Drag | null>(null);
  const held = useRef<Drag | null>(null);
  const put = (next: Drag | null): void => {
    held.current = next;
    setDrag(next);
  };
  const move = (event: PointerEvent, node: PlacingNode): void => {
    const { current } = held;
    if (current === null || current.node !== node.id || view.current === null) return;
    const by: Vec2 = [event.clientX - current.at[0], event.clientY - current.at[1]];
    put({ ...current, force: draggedForce(view.current, right, node.force, by) });
  };
  return (
    <>
      {placing.nodes.map((node) => {
        const force = drag?.node === node.id && drag.force !== null ? drag.force : node.force;
        const says = forceInWords(force, units);
        const name = `Force on ${node.label} in ${placing.loadCase}${says === '' ? '' : `: ${says}`}`;
        return (
          <button
            key={node.id}
            type="button"
            className="scene-node"
            data-place={`node ${node.id}`}
            aria-label={name}
            title={`${name}. Drag from here, or use the arrow keys; Delete takes it away.`}
            onPointerDown={(event) => {
              event.currentTarget.setPointerCapture(event.pointerId);
              put({ node: node.id, at: [event.clientX, event.clientY], force: null });
            }}
            onPointerMove={(event) => move(event, node)}
            onPointerUp={() => {
              const { current } = held;
              put(null);
              if (current?.force != null) onForce(node.place, current.force);
            }}
            onPointerCancel={() => put(null)}
            onKeyDown={(event) => {
              if (event.key === 'Escape' && held.current !== null) {
                event.stopPropagation();
                put(null);
                return;
              }
              const keyed = keyedForce(event.key, event.shiftKey, right, node.force);
              if (keyed === null) return;
              event.preventDefault();
              event.stopPropagation();
              onForce(node.place, keyed);
            }}
          >
            <span className="scene-node-dot" aria-hidden="true" />
            {drag?.node === node.id && drag.force !== null && (
              <span className="scene-node-says" aria-hidden="true">
                {says === '' ? '0' : says}
              </span>
            )}
          </button>
        );
      })}
    </>
  );
}

/** "12 kN across, 5 kN down"; empty where nothing acts. kN in. */
function forceInWords([x, y, z]: Vec3, units: UnitSystem): string {
  const level = Math.hypot(x, y);
  return [
    ...(level > 0 ? [`${showForce(1000 * level, units)} across`] : []),
    ...(z === 0 ? [] : [`${showForce(1000 * Math.abs(z), units)} ${z > 0 ? 'up' : 'down'}`]),
  ].join(', ');
}
