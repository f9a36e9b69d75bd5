import { Button } from '../../ui/button';
import { describeUploads } from './describe-uploads';
import { useUploads } from './uploads';

/** Where the margin stands below the list, the way to hand files over and their outcome stay at its head. */
export function UploadBrief({ onChoose }: { onChoose: () => void }) {
  const items = useUploads();
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-2 margin:hidden">
      <Button isSmall onClick={onChoose}>
        Hand over dose reports
      </Button>
      {items.length > 0 && (
        <>
          <span>{describeUploads(items)}</span>
          <a href="#just-received" className="link-line target">
            Each file and its outcome
          </a>
        </>
      )}
    </div>
  );
}
