interface Props {
  lanes: { productId: string; widthShare: number }[];
  products: { value: string; label: string }[];
}

/** The freezer's width as its lanes share it; the fields below say the same. */
export const LanePreview = ({ lanes, products }: Props) => (
  <div aria-hidden className="flex h-16 overflow-hidden rounded-control border-2 border-ink bg-ice-3">
    {lanes.map(({ productId, widthShare }, i) => (
      <div
        key={i}
        style={{ width: `${Number.isFinite(widthShare) ? widthShare * 100 : 0}%` }}
        className="grid min-w-0 shrink place-items-center overflow-hidden border-r border-dashed border-edge bg-ice px-1 text-small font-semibold last:border-r-0"
      >
        <span className="max-w-full truncate">{products.find(({ value }) => value === productId)?.label}</span>
      </div>
    ))}
  </div>
);
