import type { JSX } from 'react';
import { CAUTION } from '../../../core/documents/sheets/caution.ts';
import { useActions } from '../../shell/services.tsx';
import { DialogFrame } from './DialogFrame.tsx';

/** What Tautline is, and what it is not. */
export function AboutDialog(): JSX.Element {
  const actions = useActions();
  return (
    <DialogFrame title="About Tautline" onClose={actions.closeDialog}>
      <p>
        Tautline sets out braced bays of steel buildings, finds how far each angle diagonal can bow and about
        which axis, keeps its slenderness within the limit, helps to choose the angle, and hands over a
        bracing schedule with the reason for every length.
      </p>
      <h3>Cautions</h3>
      <ul className="about-cautions">
        <li>{CAUTION}</li>
        <li>Check the figures before they are used.</li>
        <li>
          Holds are judged by the marks, by the framing’s stiffness and by critical loads. Forces and
          resistances follow the loads given: diagonals and their ends, bolts and welds as a first check,
          struts and beams along themselves. Bending of members, columns, rafters, purlins, gussets and
          footings are not checked.
        </li>
        <li>Clauses given from memory say so; compare them with the standard before you rely on them.</li>
        <li>
          A building that is only partly braced is dangerous. Temporary bracing during erection is a matter of
          its own.
        </li>
      </ul>
      <h3>Axes</h3>
      <p>
        x is parallel to the shorter leg and y to the longer; u is the major principal axis and v the minor.
        Bending about an axis moves the bar at right angles to it.
      </p>
      <p className="second">MIT licence. Set in IBM Plex Sans, under the Open Font Licence.</p>
    </DialogFrame>
  );
}
