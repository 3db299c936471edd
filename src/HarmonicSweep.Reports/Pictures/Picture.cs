using HarmonicSweep.Reports.Drawing;

namespace HarmonicSweep.Reports.Pictures;

/// <summary>A picture that is planned but not yet drawn; drawing it twice gives the same bytes.</summary>
public sealed class Picture
{
    /// <summary>Width of every picture, sheet units: 640 units are meant to be 16 cm on paper.</summary>
    public const double Width = 640;

    internal const double Margin = 16;
    internal const double HeaderHeight = 46;

    private readonly string _caseTitle;
    private readonly string _choices;
    private readonly Action<Sheet> _draw;

    /// <summary>A picture that draws itself on any sheet.</summary>
    /// <param name="fileName">File name without folder and extension.</param>
    /// <param name="title">What it shows, at which bus.</param>
    /// <param name="caseTitle">Title of the case; shortened where there is no room.</param>
    /// <param name="choices">What was chosen: sequence, rule, states.</param>
    /// <param name="height">Height, sheet units.</param>
    /// <param name="draw">Draws everything below the header.</param>
    internal Picture(string fileName, string title, string caseTitle, string choices, double height, Action<Sheet> draw)
    {
        FileName = fileName;
        Title = title;
        Height = height;
        _caseTitle = caseTitle;
        _choices = choices;
        _draw = draw;
    }

    /// <summary>File name without folder and extension; differs from that of every other picture of its plan.</summary>
    public string FileName { get; }

    /// <summary>What it shows, at which bus.</summary>
    public string Title { get; }

    /// <summary>Height, sheet units.</summary>
    public double Height { get; }

    /// <summary>The picture as an SVG document with a view box; texts stay text.</summary>
    public string ToSvg()
    {
        var sheet = new SvgSheet(Width, Height, Title);
        DrawOn(sheet);
        return sheet.ToDocument();
    }

    /// <summary>The picture as the bytes of a PNG file, two pixels a sheet unit.</summary>
    public byte[] ToPng()
    {
        using var sheet = new PngSheet(Width, Height);
        DrawOn(sheet);
        return sheet.ToBytes();
    }

    internal Picture Named(string fileName) => new(fileName, Title, _caseTitle, _choices, Height, _draw);

    internal void DrawOn(Sheet sheet)
    {
        const double room = Width - 2 * Margin;
        TextStyle title = Roboto.Width(Title, Look.Title) <= room ? Look.Title : Look.LongTitle;
        sheet.Write(Roboto.Fit(Title, title, room), Margin, 23, title);
        string choices = $" · {_choices}";
        string caseTitle = Roboto.Fit(_caseTitle, Look.Subtitle, Math.Max(room - Roboto.Width(choices, Look.Subtitle), room / 4));
        sheet.Write(Roboto.Fit(caseTitle + choices, Look.Subtitle, room), Margin, 39, Look.Subtitle);
        _draw(sheet);
    }
}
