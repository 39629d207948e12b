import {
  Button,
  Menu,
  MenuDivider,
  MenuGroup,
  MenuGroupHeader,
  MenuItem,
  MenuItemRadio,
  MenuList,
  MenuPopover,
  MenuTrigger,
} from '@fluentui/react-components';
import { type Person } from '@/lib/api-model';
import { useSessionActions } from '@/lib/session';
import { ROLE_WORDS } from '@/lib/words';
import { type ThemeChoice, useThemeChoice } from './theme-choice';

interface PersonMenuProps {
  person: Person;
  className?: string;
}

/** Who is signed in, how bright the page is, and the way out. */
export function PersonMenu({ person, className }: PersonMenuProps) {
  const { choice, choose } = useThemeChoice();
  const { leave } = useSessionActions();
  return (
    <div className={className}>
      <Menu
        checkedValues={{ theme: [choice] }}
        onCheckedValueChange={(_event, { checkedItems }) => choose(checkedItems[0] as ThemeChoice)}
      >
        <MenuTrigger disableButtonEnhancement>
          <Button appearance="subtle" size="large">
            {person.name}
          </Button>
        </MenuTrigger>
        <MenuPopover>
          <MenuList>
            <MenuGroup>
              <MenuGroupHeader>
                Signed in as {ROLE_WORDS[person.role].toLowerCase()}
              </MenuGroupHeader>
              <MenuItemRadio name="theme" value="system">
                As this device is set
              </MenuItemRadio>
              <MenuItemRadio name="theme" value="light">
                Daylight
              </MenuItemRadio>
              <MenuItemRadio name="theme" value="dark">
                Dim bench
              </MenuItemRadio>
            </MenuGroup>
            <MenuDivider />
            <MenuItem onClick={() => void leave()}>Sign out</MenuItem>
          </MenuList>
        </MenuPopover>
      </Menu>
    </div>
  );
}
