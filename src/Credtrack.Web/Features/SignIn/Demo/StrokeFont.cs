using SkiaSharp;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>The few letters an invented picture needs, as strokes of a pen: the image library brings no typeface.</summary>
internal static class StrokeFont
{
    // Width and path of a glyph on a grid whose base line is 0, x-height -5 and ascender -8.
    private static readonly Dictionary<char, (float Width, SKPath Path)> Glyphs = new (char Letter, float Width, string Path)[]
    {
        ('0', 5, "M2.5,-8 C0.8,-8 0.5,-6 0.5,-4 S0.8,0 2.5,0 S4.5,-2 4.5,-4 S4.2,-8 2.5,-8Z"),
        ('1', 5, "M1,-6.5 L3,-8 V0"),
        ('2', 5, "M0.6,-6.2 C0.8,-8.6 4.4,-8.6 4.4,-5.8 C4.4,-4 1.5,-2.2 0.5,0 H4.5"),
        ('3', 5, "M0.7,-7.2 C2,-8.6 4.3,-8 4.3,-6.1 C4.3,-4.6 3,-4.3 2,-4.3 C3.3,-4.3 4.6,-3.6 4.6,-2.2 C4.6,0.2 1.8,0.6 0.5,-0.9"),
        ('4', 5, "M3.7,0 V-8 L0.4,-2.3 H4.8"),
        ('5', 5, "M4.2,-8 H1.2 L0.8,-4.4 C2,-5.4 4.6,-5.2 4.6,-2.6 C4.6,0.3 1.6,0.6 0.5,-0.8"),
        ('6', 5, "M4,-7.6 C2,-8.6 0.5,-6.4 0.5,-2.9 C0.5,0.9 4.6,0.9 4.6,-2.4 C4.6,-5.4 1.2,-5.5 0.5,-2.9"),
        ('7', 5, "M0.5,-8 H4.6 L2,0"),
        ('8', 5, "M2.5,-8 C0.3,-8 0.3,-4.4 2.5,-4.4 S4.7,0 2.5,0 S0.3,-4.4 2.5,-4.4 S4.7,-8 2.5,-8Z"),
        ('9', 5, "M1,-0.4 C3,0.6 4.5,-1.6 4.5,-5.1 C4.5,-8.9 0.4,-8.9 0.4,-5.6 C0.4,-2.6 3.8,-2.5 4.5,-5.1"),
        ('I', 2, "M1,-8 V0"),
        ('a', 5, "M0.8,-4.4 C2,-5.4 4.3,-5.3 4.3,-3.2 V0 M4.3,-2.9 C1.8,-3.1 0.5,-2.6 0.5,-1.3 C0.5,0.4 3.2,0.4 4.3,-1.3"),
        ('c', 4.5f, "M4.2,-4.2 C3,-5.6 0.5,-5.2 0.5,-2.5 S3,0.6 4.2,-0.8"),
        ('d', 5, "M4.4,-8 V0 M4.4,-2.5 C4.4,-5.9 0.5,-5.9 0.5,-2.5 S4.4,0.9 4.4,-2.5"),
        ('e', 5, "M0.6,-2.7 H4.5 C4.5,-5.8 0.5,-5.9 0.5,-2.5 C0.5,0.5 3.2,0.6 4.3,-0.9"),
        ('g', 5, "M4.4,-5 V0.4 C4.4,2.5 1.8,2.7 0.8,1.6 M4.4,-2.5 C4.4,-5.9 0.5,-5.9 0.5,-2.5 S4.4,0.9 4.4,-2.5"),
        ('i', 1.6f, "M0.8,-5 V0 M0.8,-7.4 V-7"),
        ('m', 7, "M0.6,-5 V0 M0.6,-3.2 C1.2,-5.6 3.5,-5.6 3.5,-3.2 V0 M3.5,-3.2 C4.1,-5.6 6.4,-5.6 6.4,-3.2 V0"),
        ('n', 5, "M0.6,-5 V0 M0.6,-3 C1.2,-5.7 4.3,-5.7 4.3,-3 V0"),
        ('o', 5, "M2.5,-5.1 C-0.2,-5.1 -0.2,0.1 2.5,0.1 S5.2,-5.1 2.5,-5.1Z"),
        ('p', 5, "M0.6,-5 V2.4 M0.6,-2.5 C0.6,-5.9 4.5,-5.9 4.5,-2.5 S0.6,0.9 0.6,-2.5"),
        ('r', 3.4f, "M0.6,-5 V0 M0.6,-2.8 C0.9,-4.6 2,-5.2 3.2,-4.9"),
        ('t', 3.6f, "M1.5,-7 V-1.4 C1.5,0 2.4,0.3 3.4,-0.2 M0.2,-5 H3.3"),
        ('v', 4.8f, "M0.4,-5 L2.4,0 L4.4,-5"),
        ('w', 7, "M0.4,-5 L2,0 L3.5,-4.6 L5,0 L6.6,-5"),
        (',', 1.8f, "M1,-0.4 L0.5,1.4"),
        (' ', 2.6f, "")
    }.ToDictionary(g => g.Letter, g => (g.Width, SKPath.ParseSvgPathData(g.Path) ?? new SKPath()));

    /// <summary>Writes the text with its base line starting at that point; size 1 makes a figure 8 pixels high.</summary>
    /// <exception cref="KeyNotFoundException">A letter has no glyph.</exception>
    public static void Write(SKCanvas canvas, string text, float x, float y, float size, SKPaint pen)
    {
        using var kept = new SKAutoCanvasRestore(canvas);
        canvas.Translate(x, y);
        canvas.Scale(size);
        foreach (var letter in text)
        {
            var (width, path) = Glyphs[letter];
            canvas.DrawPath(path, pen);
            canvas.Translate(width + 1.5f, 0);
        }
    }
}
