import { MarginNote } from '../../ui/margin-note';

/** When to type, and when not. */
export const EntryHelp = () => (
  <>
    <MarginNote title="When no report came">
      <p className="text-sm">
        First look on the machine whether the case was closed and the dose report sent; many machines send it
        once more on request. A report holds every exposure, a typed entry only the totals.
      </p>
      <p className="text-sm">
        Type an entry for a machine that writes no report, or whose report is lost. Photograph the screen
        before the next patient is opened: then the figures are gone.
      </p>
      <p className="text-sm">
        If the report comes after all, hand it over as usual. The physicist joins it with this entry, and its
        figures count.
      </p>
    </MarginNote>
    <MarginNote title="Units">
      <p className="text-sm">
        One machine shows 12.5 Gy·cm², another 1250 µGy·m² or 1250 cGy·cm² for the same. Choose the unit on
        the screen; the amount in the units of the lists appears below the number.
      </p>
      <p className="text-sm">An air kerma above 3 Gy or an area product above 300 Gy·cm² is typed twice.</p>
    </MarginNote>
    <MarginNote title="After it is stored">
      <p className="text-sm">
        The procedure stands in every list and count with a pencil and the words “entered by hand”. A wrong
        figure is corrected with a reason; a wrong patient or a case that never was is withdrawn on the
        procedure’s page.
      </p>
    </MarginNote>
  </>
);
