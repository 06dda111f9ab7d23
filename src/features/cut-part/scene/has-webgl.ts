/** Whether this browser can draw in three dimensions here and now. */
export function hasWebgl(): boolean {
  const context = document.createElement('canvas').getContext('webgl2');
  // Browsers keep few contexts; this one is not wanted any more.
  context?.getExtension('WEBGL_lose_context')?.loseContext();
  return Boolean(context);
}
