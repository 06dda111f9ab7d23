/** An SVG made by the kernel, which escapes every text in it; scales to the width it is given. */
export function SvgPicture({ svg, className }: { readonly svg: string; readonly className?: string }) {
  return (
    <div className={`[&>svg]:h-auto [&>svg]:w-full ${className ?? ''}`} dangerouslySetInnerHTML={{ __html: svg }} />
  );
}
