import type { SheetModel } from '#shared/kernel/sheet/sheet-model.ts';

/**
 * The sheet's model as the browser can know it: no files are written here, so what the model says of their proof
 * would be wrong for a released revision. It is proved on the server, at the release and before each download.
 */
export const sayProof = (model: SheetModel): SheetModel => ({
  ...model,
  pages: model.pages.map((page) => ({
    ...page,
    blocks: page.blocks.map((block) =>
      block.id === 'proof' && block.kind === 'list'
        ? {
            ...block,
            items: [
              {
                word: 'Proved.',
                text: 'The files were read back and held against this geometry when the revision was released, and are again before each download. Each check stands on the setup sheet in the layer set.',
              },
            ],
          }
        : block,
    ),
  })),
});
