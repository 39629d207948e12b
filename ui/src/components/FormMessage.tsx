import { MessageBar, MessageBarBody } from '@fluentui/react-components';

/** What is wrong with a form as a whole; nothing while nothing is. */
export function FormMessage({ message }: { message?: string }) {
  if (!message) return null;
  return (
    <MessageBar intent="error" layout="multiline" role="alert">
      <MessageBarBody>{message}</MessageBarBody>
    </MessageBar>
  );
}
