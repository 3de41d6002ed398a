/** There was nothing to undo or redo when its turn came. */
export class NothingToUndo extends Error {
  override readonly name = 'NothingToUndo';
}
