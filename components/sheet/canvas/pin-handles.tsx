import type { NodeHandle } from 'reactflow';

/**
 * Where wires end on a node. The flow measures these elements when it first sees the node; its own handle component would
 * follow every connection in progress, which is the editor's business here.
 */
export function PinHandles({ handles }: { readonly handles: readonly NodeHandle[] }) {
  return handles.map((handle) => (
    <span key={handle.id} aria-hidden="true" className="source pointer-events-none absolute size-px" data-handleid={handle.id} data-handlepos={handle.position} style={{ left: handle.x, top: handle.y }} />
  ));
}
