/** What dxf-writer's entities write their tags to. */
export interface TagSink {
  push(code: number, value: string | number): void;
}

/** An entity of dxf-writer, as far as we meet it. */
export interface TaggedShape {
  tags(sink: TagSink): void;
}

/** Has an entity of dxf-writer write `mend(code, value)` in place of each value. */
export function mendTags(shape: TaggedShape, mend: (code: number, value: string | number) => string | number): void {
  const write = shape.tags.bind(shape);
  shape.tags = (sink) => {
    const mending = Object.create(sink) as TagSink;
    mending.push = (code, value) => sink.push(code, mend(code, value));
    write(mending);
  };
}
