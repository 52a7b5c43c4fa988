import type { JSX } from 'react';
import { Group, Panel, Separator } from 'react-resizable-panels';
import { BaysPanel } from '../panels/bays/BaysPanel.tsx';
import { CardPanel } from '../panels/card/CardPanel.tsx';
import { Dock } from '../panels/dock/Dock.tsx';
import { RecipePanel } from '../panels/recipe/RecipePanel.tsx';
import type { Theme } from '../theme/themeSetting.ts';
import { PartBoundary } from './PartBoundary.tsx';
import { useDockSizes } from './useDockSizes.ts';
import { ViewPanel } from './view/ViewPanel.tsx';
import './layout.css';

/** Bays and recipe to the left, the bay in 3D in the middle, the card at full height to the right, the tables below. */
export function Layout({ theme }: { readonly theme: Theme }): JSX.Element {
  const { sizes, tables, onLeft, onCard, onLayoutChanged } = useDockSizes();
  return (
    <Group orientation="horizontal" className="docks" onLayoutChanged={onLayoutChanged}>
      <Panel id="workspace" minSize={560} className="dock-panel">
        <Group orientation="vertical" className="docks" onLayoutChanged={onLayoutChanged}>
          <Panel id="upper" minSize={240} className="dock-panel">
            <Group orientation="horizontal" className="docks" onLayoutChanged={onLayoutChanged}>
              <Panel
                id="bays"
                onResize={onLeft}
                defaultSize={sizes.left}
                minSize={200}
                maxSize={400}
                groupResizeBehavior="preserve-pixel-size"
                className="dock-panel"
              >
                <aside className="left" data-region tabIndex={-1} aria-label="Bays and recipe">
                  <PartBoundary part="the bays and the recipe">
                    <BaysPanel />
                    <RecipePanel />
                  </PartBoundary>
                </aside>
              </Panel>
              <Separator className="gutter upright" aria-label="Width of the bays" />
              <Panel id="view" minSize={320} className="dock-panel">
                <PartBoundary part="the view">
                  <ViewPanel theme={theme} />
                </PartBoundary>
              </Panel>
            </Group>
          </Panel>
          <Separator className="gutter level" aria-label="Height of the tables" />
          <Panel
            id="tables"
            panelRef={tables.panel}
            onResize={tables.onResize}
            defaultSize={sizes.tables.schedule}
            minSize={104}
            maxSize="70%"
            groupResizeBehavior="preserve-pixel-size"
            className="dock-panel"
          >
            <PartBoundary part="the tables">
              <Dock />
            </PartBoundary>
          </Panel>
        </Group>
      </Panel>
      <Separator className="gutter upright" aria-label="Width of the card" />
      <Panel
        id="card"
        onResize={onCard}
        defaultSize={sizes.card}
        minSize={356}
        maxSize={560}
        // In a window made narrower the tables need their share of the room too.
        groupResizeBehavior="preserve-relative-size"
        className="dock-panel"
      >
        <PartBoundary part="the card">
          <CardPanel />
        </PartBoundary>
      </Panel>
    </Group>
  );
}
