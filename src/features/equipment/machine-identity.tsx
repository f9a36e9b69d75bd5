import type { Equipment } from '../../../shared/contract/equipment';
import { formatInteger } from '../../../shared/units';
import { DefinitionList, DefinitionRow } from '../../ui/definition-row';

/** Who a machine says it is. */
export const MachineIdentity = ({ machine }: { machine: Equipment }) => (
  <DefinitionList>
    <DefinitionRow name="Manufacturer">{machine.manufacturer ?? 'not given'}</DefinitionRow>
    <DefinitionRow name="Model">{machine.modelName ?? 'not given'}</DefinitionRow>
    <DefinitionRow name="Serial number">{machine.serialNumber ?? 'not given'}</DefinitionRow>
    <DefinitionRow name="Station name">{machine.stationName ?? 'not given'}</DefinitionRow>
    <DefinitionRow name="Reports stored">{formatInteger(machine.reportCount)}</DefinitionRow>
  </DefinitionList>
);
