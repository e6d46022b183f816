import { interfaceTexts } from '@/lib/texts/interface-texts';
import { MissingSeed } from './missing-seed';
import { Seedling } from './seedling';

const ground = 30;

/** What the drawing means, each sign beside its words. */
export function TapeLegend() {
  const texts = interfaceTexts.tape;
  const signs = [
    {
      text: texts.legendHeight,
      drawing: (
        <>
          <Seedling x={10} y={ground} height={24} grows="up" look="on-time" />
          <Seedling x={24} y={ground} height={14} grows="up" look="on-time" />
        </>
      ),
    },
    {
      text: texts.legendLate,
      drawing: <Seedling x={17} y={ground} height={16} grows="up" look="late" />,
    },
    { text: texts.legendMissing, drawing: <MissingSeed x={17} y={ground - 7} /> },
    {
      text: texts.legendDouble,
      drawing: (
        <>
          <Seedling x={12} y={ground} height={18} grows="up" look="on-time" />
          <Seedling x={21} y={ground} height={18} grows="up" look="on-time" />
          <path d="M6 8v-5h21v5" fill="none" strokeWidth={1.4} className="stroke-ink" />
        </>
      ),
    },
    {
      text: texts.legendUnknown,
      drawing: <Seedling x={17} y={ground} height={11} grows="up" look="unknown" />,
    },
    {
      text: texts.legendMark,
      drawing: <path d="M17 16V36" fill="none" strokeWidth={4} className="stroke-ink" />,
    },
  ];
  return (
    <ul className="flex flex-wrap gap-x-6 gap-y-1 text-13">
      {signs.map((sign) => (
        <li key={sign.text} className="flex items-center gap-2">
          <svg aria-hidden="true" viewBox="0 0 34 38" width={34} height={38} className="shrink-0">
            <path d="M0 30.5H34" fill="none" strokeWidth={1} className="stroke-ink" />
            {sign.drawing}
          </svg>
          {sign.text}
        </li>
      ))}
    </ul>
  );
}
