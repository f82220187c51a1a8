import type { MailMessage } from '@tipward/contract';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../../components/ui/empty-state.tsx';
import { Loaded } from '../../../components/ui/loaded.tsx';
import { Moment } from '../../../components/ui/moment.tsx';
import { PageHeader } from '../../../components/ui/page-header.tsx';
import { useCaughtMail } from '../api/list-caught-mail.ts';
import { splitLinks } from '../lib/split-links.ts';

function Message({ message }: { message: MailMessage }) {
  return (
    <article className="border-t border-rule py-4">
      <h2 className="m-0 text-base font-semibold wrap-anywhere">{message.subject}</h2>
      <p className="m-0 text-[13px] text-ink-soft wrap-anywhere">
        to {message.to.join(', ')}, <Moment at={message.receivedAt} exact />
      </p>
      <p className="figures m-0 mt-3 max-w-[80ch] text-[13px] whitespace-pre-wrap wrap-anywhere">
        {splitLinks(message.text).map((part, i) =>
          part.isLink ? (
            <a key={i} href={part.text} className="link">
              {part.text}
            </a>
          ) : (
            part.text
          ),
        )}
      </p>
    </article>
  );
}

/** What the application has sent on a machine without a mail server. Addresses open in this tab. */
export function CaughtMailPage() {
  const mail = useCaughtMail();
  return (
    <div className="mx-auto max-w-3xl">
      <PageHeader
        title="Caught mail"
        meta="On this machine no mail leaves; all of it is shown here, newest first, to whoever can open this page."
        actions={
          <Link to="/" className="link">
            To Tipward
          </Link>
        }
      />
      <Loaded query={mail} what="the caught mail">
        {({ items }) =>
          items.length === 0 ? (
            <EmptyState title="No mail yet">
              Invitations, links for a new password, reviews and releases appear here a few seconds after they
              happen.
            </EmptyState>
          ) : (
            items.map((message) => <Message key={message.id} message={message} />)
          )
        }
      </Loaded>
    </div>
  );
}
