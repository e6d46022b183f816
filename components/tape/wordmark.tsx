import { interfaceTexts } from '@/lib/texts/interface-texts';

type WordmarkProps = {
  /** Height of the letters: in a header, or alone on a page for signing in. */
  size?: 'header' | 'page';
};

const tapeWidth = 96;
const inch = tapeWidth / 12;

/** The name, standing on a piece of the tape. */
export function Wordmark({ size = 'header' }: WordmarkProps) {
  return (
    <span className={`inline-flex flex-col ${size === 'page' ? 'text-34' : 'text-21'}`}>
      <span className="font-bold leading-none tracking-[0.01em]">{interfaceTexts.product.name}</span>
      <svg aria-hidden="true" viewBox={`0 0 ${tapeWidth} 10`} className="-mt-px block h-auto w-0 min-w-full">
        <rect
          x={0.5}
          y={0.5}
          width={tapeWidth - 1}
          height={9}
          strokeWidth={1}
          className="fill-bone stroke-ink"
        />
        {Array.from({ length: 11 }, (_, index) => index + 1).map((mark) => (
          <path
            key={mark}
            d={`M${mark * inch} 0.5v${mark % 6 === 0 ? 6 : mark % 3 === 0 ? 4.5 : 3}`}
            strokeWidth={mark % 6 === 0 ? 1.4 : 0.9}
            className="stroke-ink"
          />
        ))}
      </svg>
    </span>
  );
}
