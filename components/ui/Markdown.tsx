import clsx from "clsx";
import ReactMarkdown, { type Components } from "react-markdown";

/** Headings of an entry stand below the page's own; a link to elsewhere gives nothing away and passes no standing on. */
const PARTS: Components = {
  h1: ({ children }) => <h3>{children}</h3>,
  h2: ({ children }) => <h3>{children}</h3>,
  h3: ({ children }) => <h4>{children}</h4>,
  h4: ({ children }) => <h5>{children}</h5>,
  h5: ({ children }) => <h6>{children}</h6>,
  a: ({ href, children }) =>
    isOwn(href) ? (
      <a href={href} className="link">
        {children}
      </a>
    ) : (
      <a href={href} rel="noopener noreferrer nofollow ugc" target="_blank" className="link">
        {children}
        <span className="sr-only"> (opens in a new tab)</span>
      </a>
    ),
  // A picture from elsewhere would tell its server who reads the log; it stays a link.
  img: ({ src, alt }) => {
    if (typeof src !== "string") return <>{alt}</>;
    // eslint-disable-next-line @next/next/no-img-element -- private pictures come through the app, at their own size
    if (isOwn(src)) return <img src={src} alt={alt ?? ""} loading="lazy" className="rounded border border-rule" />;
    return (
      <a href={src} rel="noopener noreferrer nofollow ugc" target="_blank" className="link">
        {alt || "Picture elsewhere"}
      </a>
    );
  },
};

const isOwn = (href: string | undefined) =>
  Boolean(href?.startsWith("/") && !href.startsWith("//")) || Boolean(href?.startsWith("#"));

const LOOK = clsx(
  "max-w-prose text-pretty break-words [&>*+*]:mt-3 [&>:first-child]:mt-0! [&_h3]:mt-5 [&_h3]:text-lg [&_h4]:mt-4 [&_h4]:text-base",
  "[&_ul]:list-['–__'] [&_ul]:pl-5 [&_ol]:list-decimal [&_ol]:pl-6 [&_li+li]:mt-1 [&_li::marker]:text-ink-faint",
  "[&_code]:mono [&_code]:rounded-sm [&_code]:bg-ink/7 [&_code]:px-1 [&_code]:py-px [&_code]:text-[0.875em]",
  "[&_pre]:overflow-x-auto [&_pre]:rounded [&_pre]:border [&_pre]:border-rule [&_pre]:bg-raised [&_pre]:p-3 [&_pre_code]:bg-transparent [&_pre_code]:p-0",
  "[&_blockquote]:border-l-2 [&_blockquote]:border-rule-strong [&_blockquote]:pl-4 [&_blockquote]:text-ink-soft",
  "[&_hr]:border-rule [&_img]:h-auto [&_img]:max-w-full",
);

/** Markdown as people write it in the log. HTML in it is dropped; addresses other than http, https and mailto too. */
export function Markdown({ text, className }: { text: string; className?: string }) {
  return (
    <div className={clsx(LOOK, className)}>
      <ReactMarkdown skipHtml components={PARTS}>
        {text}
      </ReactMarkdown>
    </div>
  );
}
