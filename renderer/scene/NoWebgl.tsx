/** Says why the bay is drawn flat, and what that leaves out. */
export function NoWebgl({ lost, onAgain }: { readonly lost: boolean; readonly onAgain: () => void }) {
  return (
    <div className="scene-notice" role="status">
      <p>
        <b>{lost ? 'The 3D drawing was lost' : 'No 3D drawing here'}</b>
        {lost
          ? ' The graphics card let it go.'
          : ' This machine gives no WebGL 2, which the 3D view is drawn with: it may be switched off, or the graphics driver may be missing.'}{' '}
        The bay is drawn flat instead and cannot be turned; everything else works as always.
      </p>
      <button type="button" onClick={onAgain}>
        Try 3D again
      </button>
    </div>
  );
}
