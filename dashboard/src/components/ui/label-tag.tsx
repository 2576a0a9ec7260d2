import Tag from '@douyinfe/semi-ui/lib/es/tag';

/** A short label of a thing (a flag, a kind of run), never a verdict. */
export function LabelTag({ children }: { children: string }) {
  return <Tag>{children}</Tag>;
}
