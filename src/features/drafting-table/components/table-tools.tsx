export type Tool = 'look' | 'move' | 'tape';

type TableToolsProps = {
  readonly tool: Tool;
  readonly moved: boolean;
  readonly onTool: (tool: Tool) => void;
  readonly onSnapBack: () => void;
};

const look =
  'min-h-9 rounded-one px-2 max-sm:min-h-11 max-sm:min-w-11 pointer-coarse:min-h-11 pointer-coarse:min-w-11 hover:bg-cloth aria-pressed:bg-brass aria-pressed:font-semibold aria-pressed:text-on-brass';

/** What the hand holds: nothing, a piece to move it, or the measuring tape. */
export const TableTools = ({ tool, moved, onTool, onSnapBack }: TableToolsProps) => (
  <div
    role="toolbar"
    aria-label="Tools"
    className="flex items-center rounded-one border border-rule bg-ground text-sm"
  >
    {moved && (
      <button type="button" className={look} onClick={onSnapBack}>
        Snap back
      </button>
    )}
    <button
      type="button"
      className={look}
      aria-pressed={tool === 'move'}
      aria-label="Move pieces"
      onClick={() => onTool(tool === 'move' ? 'look' : 'move')}
    >
      Move<span className="max-sm:hidden">&nbsp;pieces</span>
    </button>
    <button
      type="button"
      className={look}
      aria-pressed={tool === 'tape'}
      onClick={() => onTool(tool === 'tape' ? 'look' : 'tape')}
    >
      Tape
    </button>
  </div>
);
