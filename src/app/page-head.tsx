import type { PhotoView } from "#shared/contracts/photos.ts";
import { usePageSettings } from "#src/lib/page-settings.ts";

interface PageHeadProps {
  title: string;
  description: string;
  /** The page's own address, without the site's. */
  path: string;
  type?: "website" | "article" | "profile";
  image?: { photo: PhotoView | null; alt: string };
  feeds?: { title: string; atom: string; json: string };
}

/** What a public page says of itself to browsers, search engines and whoever shows a link to it. */
export function PageHead({ title, description, path, type = "website", image, feeds }: PageHeadProps) {
  const { siteUrl } = usePageSettings();
  const picture = image?.photo?.webp.at(-1);
  return (
    <>
      <title>{title === "Soapstone" ? title : `${title} · Soapstone`}</title>
      <meta name="description" content={description} />
      <link rel="canonical" href={siteUrl + path} />
      <meta property="og:site_name" content="Soapstone" />
      <meta property="og:type" content={type} />
      <meta property="og:title" content={title} />
      <meta property="og:description" content={description} />
      <meta property="og:url" content={siteUrl + path} />
      {picture ? <meta property="og:image" content={siteUrl + picture.url} /> : null}
      {picture && image?.alt ? <meta property="og:image:alt" content={image.alt} /> : null}
      {feeds ? (
        <>
          <link rel="alternate" type="application/atom+xml" title={feeds.title} href={siteUrl + feeds.atom} />
          <link
            rel="alternate"
            type="application/feed+json"
            title={feeds.title}
            href={siteUrl + feeds.json}
          />
        </>
      ) : null}
    </>
  );
}
