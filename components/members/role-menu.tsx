import { Menu, type MenuItem } from '@/components/ui/menu';
import type { Role } from '@/contract';
import { roleWords } from './role-words';

export interface RoleMenuProps<R extends Role> {
  /** Whose role it is, for those who listen. */
  name: string;
  role: R;
  roles: readonly R[];
  disabled?: boolean;
  /** What else can be done from here, under the roles. */
  more?: readonly MenuItem[];
  onChoose: (role: R) => void;
}

/** Room for the longest role, px. */
const WIDTH = 120;

/** One role out of several, each with what it lets someone do. */
export function RoleMenu<R extends Role>({ name, role, roles, disabled, more = [], onChoose }: RoleMenuProps<R>) {
  const items = roles.map((choice) => ({
    key: choice,
    label: choice,
    hint: roleWords(choice),
    current: choice === role,
    onSelect: () => {
      if (choice !== role) onChoose(choice);
    },
  }));
  return <Menu label={role} name={name} disabled={disabled} align="right" width={WIDTH} items={[...items, ...more]} />;
}
