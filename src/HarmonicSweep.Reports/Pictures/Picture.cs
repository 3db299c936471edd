namespace HarmonicSweep.Reports.Pictures;

/// <summary>A picture that is planned but not yet drawn; drawing it twice gives the same bytes.</summary>
public sealed class Picture
{
    private readonly Lazy<Page> _page;

    /// <summary>Plans a picture.</summary>
    /// <param name="fileName">File name without folder and extension.</param>
    /// <param name="title">What it shows, at which bus.</param>
    /// <param name="page">Lays it out.</param>
    internal Picture(string fileName, string title, Func<Page> page)
    {
        FileName = fileName;
        Title = title;
        _page = new Lazy<Page>(page);
    }

    private Picture(string fileName, Picture other)
    {
        FileName = fileName;
        Title = other.Title;
        _page = other._page;
    }

    /// <summary>File name without folder and extension; differs from that of every other picture of its plan.</summary>
    public string FileName { get; }

    /// <summary>What it shows, at which bus.</summary>
    public string Title { get; }

    /// <summary>The picture as the bytes of a PNG file.</summary>
    public byte[] ToPng() => _page.Value.ToPng();

    /// <summary>The picture as the bytes of an SVG file with a view box; texts stay text.</summary>
    public byte[] ToSvg() => _page.Value.ToSvg();

    internal Picture Named(string fileName) => new(fileName, this);
}
