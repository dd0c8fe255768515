using System.Globalization;
using PdfSharp.Drawing;
using PdfSharp.Pdf;
using Tag = PdfSharp.UniversalAccessibility.PdfBlockLevelElementTag;

namespace Credtrack.Web.Features.Documents.Summaries;

/// <summary>What the summary says, from the top down. Everything hangs from the skin line; who and what for stands above it.</summary>
internal sealed class SummaryPages(SummaryFacts facts, CheckCode code, string pages)
{
    private const string Demonstration = "Demonstration: every person and figure here is invented";
    private const string Kind = "Competency summary";

    /// <returns>How many pages it took.</returns>
    public int Draw(PdfDocument document)
    {
        using var sheet = new Sheet(document, facts.Paper, Head, Foot);
        sheet.Y += 10;
        sheet.Paragraph(Sheet.Left, sheet.Right - Sheet.Left, facts.Holder, Style.Title, Tag.Heading1);
        sheet.Y += 4;
        sheet.Paragraph(Sheet.Left, sheet.Right - Sheet.Left, facts.Privilege, Style.Lead);
        sheet.Y += 8;
        foreach (var (label, value) in new[] { ("Granted", $"from {facts.GrantedFrom.InFull()}, {(facts.GrantedUntil is { } last ? $"until {last.InFull()}" : "no end date is set")}"), ("Programme", facts.Programme), ("Site", facts.Site) })
            sheet.Pair(Sheet.Left, Sheet.Matter - Sheet.Left, label, value, Style.Text);

        var scan = DepthRow.Scan(sheet, facts.Lines.Select(l => l.Required).OfType<int>());
        foreach (var line in facts.Lines) Counted(sheet, line, scan);
        Rules(sheet);
        if (facts.GapReason is not null || facts.Lines.Any(l => l.Unmet.Any())) Gap(sheet);
        Signature(sheet);
        Check(sheet);
        Caution(sheet);
        return sheet.Page;
    }

    private void Head(Sheet sheet)
    {
        void Air(Action<Action> write)
        {
            write(() => sheet.Write(Sheet.Left, sheet.Y, Kind + " ", Style.NoteStrong));
            write(() => sheet.WriteTo(sheet.Right, sheet.Y, facts.DocumentCode, Style.NoteStrong));
            sheet.Y += Style.Note.Leading;
            var words = sheet.Page == 1 ? facts.IsDemonstration ? Demonstration : "" : facts.Holder;
            if (words.Length > 0) write(() => sheet.Y = sheet.Lines(Sheet.Left, sheet.Y, sheet.Wrap(sheet.MatterWidth, words, Style.Note), Style.Note));
        }

        if (sheet.Page == 1) Air(draw => sheet.Tagged(Tag.Paragraph, draw));
        else Air(sheet.Artifact);
        sheet.Y += 5;
        sheet.Line(Sheet.Left, sheet.Y + 1.5, sheet.Right, Ink.Dark.Pen(3));
        sheet.Y += sheet.Page == 1 ? 3 : 15;
    }

    private void Foot(Sheet sheet)
    {
        var y = sheet.End + 12;
        sheet.Pen.DrawLine(Ink.Hairline.Pen(), Sheet.Left, y, sheet.Right, y);
        sheet.Write(Sheet.Left, y + 4, facts.IsDemonstration ? $"{facts.DocumentCode}  {Demonstration}" : facts.DocumentCode, Style.Note);
        sheet.WriteTo(sheet.Right, y + 4, $"page {sheet.Page.ToString(CultureInfo.InvariantCulture)} of {pages}", Style.Note);
    }

    private static void Counted(Sheet sheet, SummaryLine line, double scan)
    {
        var table = new RequirementTable(sheet, line.Requirements);
        var words = $"{line.Performed.Of("scan")} performed, {line.Read.ToString(CultureInfo.InvariantCulture)} read, {line.Counted.ToString(CultureInfo.InvariantCulture)} counted.";
        var least = Style.Count.Leading + (line.Required is null ? 0 : DepthRow.Height) + (line.Requirements.Count == 0 ? 0 : table.Least);
        sheet.Section(line.Application, "", least, () =>
        {
            sheet.Y -= Style.Count.Base - Style.Heading.Base;
            sheet.Paragraph(Sheet.Matter, sheet.MatterWidth, words, Style.Count);
            if (line.Required is { } required) new DepthRow(sheet, line, required, scan).Draw();
            if (line.Requirements.Count > 0) table.Draw();
        });
    }

    private void Rules(Sheet sheet) => Pairs(sheet, "Counted by", ("Rulebook", $"{facts.RulebookName}, version {facts.RulebookVersion}"), ("As of", facts.AsOf.InFull(facts.Zone)));

    private void Gap(Sheet sheet)
    {
        string[] unmet = [.. from line in facts.Lines from r in line.Unmet select $"{line.Application}: {r.Asked}; found: {r.Value}."];
        sheet.Section("Signed over a gap", "", 3 * Style.Text.Leading, () =>
        {
            Say(unmet.Length == 0 ? "Every requirement named here was met." : "Not met when this was signed:", Style.Text);
            foreach (var requirement in unmet) Say(requirement, Style.Strong);
            sheet.Y += 4;
            Say(facts.GapReason is null ? "No reason was recorded." : $"Reason given by {facts.SignerName}:", Style.Label);
            if (facts.GapReason is { } reason) Say(reason, Style.Text);
        });

        void Say(string words, Style style) => sheet.Paragraph(Sheet.Matter, sheet.MatterWidth, words, style);
    }

    private void Signature(Sheet sheet) => Pairs(sheet, "Signed by",
        ("Name", facts.SignerName), ("Role", facts.SignerRole), ("Signed at", facts.SignedAt.InFull(facts.Zone)), ("Meaning", facts.Meaning));

    private void Check(Sheet sheet)
    {
        const double quiet = 10;
        (string Words, Style Style)[] said =
        [
            (facts.DocumentCode, Style.Code), (facts.CheckAddress, Style.Strong),
            ("Point a phone at the square, or open the address and compare: the page shows whether this document was issued here, whether it still holds, and what it must say.", Style.Text),
            ("The file is sealed. SHA-256 fingerprint of the sealing certificate:", Style.Note), (facts.CertificateFingerprint, Style.NoteStrong),
            .. facts.LedgerHead is null ? [] : new[] { ("Head of the ledger's chain:", Style.Note), (facts.LedgerHead, Style.NoteStrong) },
        ];
        sheet.Section("Check this document", "", said.Sum(s => sheet.Tall(sheet.MatterWidth, s.Words, s.Style)), () =>
        {
            sheet.Y -= 2;
            foreach (var (words, style) in said)
            {
                if (style == Style.Note) sheet.Y += 3;
                sheet.Paragraph(Sheet.Matter, sheet.MatterWidth, words, style);
            }
        }, (quiet + code.Side, Square));

        void Square()
        {
            var box = new XRect(Sheet.Left, sheet.Y + quiet, code.Side, code.Side);
            sheet.Figure($"QR code with the address {facts.CheckAddress}", box, () => code.Draw(sheet.Pen, box.X, box.Y));
        }
    }

    private static void Caution(Sheet sheet)
    {
        const string words = "Privileges are granted under local rules, by the people licensed to grant them. Credtrack counts and shows only; it does not decide.";
        sheet.Section("Who decides", "", sheet.Tall(sheet.MatterWidth, words, Style.Text), () => sheet.Paragraph(Sheet.Matter, sheet.MatterWidth, words, Style.Text));
    }

    private static void Pairs(Sheet sheet, string heading, params (string Label, string Value)[] pairs)
    {
        const double indent = 60;
        var least = pairs.Sum(p => sheet.Tall(sheet.MatterWidth - indent, p.Value, Style.Text));
        // A signature stays together with its meaning, unless the meaning alone is as long as half a page.
        sheet.Section(heading, "", Math.Min(least, sheet.Height / 2), () => { foreach (var (label, value) in pairs) sheet.Pair(Sheet.Matter, indent, label, value, Style.Text); });
    }
}
