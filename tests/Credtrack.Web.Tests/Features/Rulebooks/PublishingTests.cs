using System.Diagnostics;
using System.Text;
using AngleSharp.Dom;
using AngleSharp.Html.Dom;
using Credtrack.Core.Rulebooks;
using Credtrack.Core.Rulebooks.Templates;
using Credtrack.Web.Tests.Features.Applications;

namespace Credtrack.Web.Tests.Features.Rulebooks;

public sealed class PublishingTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Theory]
    [InlineData(MembershipKind.Director)]
    [InlineData(MembershipKind.Coordinator)]
    public async Task A_template_is_looked_at_in_words_and_published(MembershipKind kind)
    {
        var world = await site.NewWorld();
        using var visitor = await (await world.As(await world.Another("Pat", kind))).Opens("/rulebooks");
        await visitor.Opens(visitor.Page.QuerySelector("a[href^='/rulebooks/new']")!.GetAttribute("href")!);
        await visitor.Fills("Template", "acep-2016").Presses("Take the template");
        Assert.Equal(HttpStatusCode.OK, visitor.Status);
        Assert.Contains("doi 10.1016/j.annemergmed.2016.08.457", visitor.Text, StringComparison.Ordinal);
        Assert.Contains("150 scans in all applications (goal 300)", visitor.Text, StringComparison.Ordinal);
        Assert.Contains("Focused cardiac: 25 scans (goal 50)", visitor.Page.QuerySelectorAll("ins").Select(e => e.TextContent));
        Assert.Contains("Focused cardiac: 3 scans", visitor.Page.QuerySelectorAll("del").Select(e => e.TextContent));
        Assert.Contains("The text calls itself version 1; here it becomes version 2.", visitor.Text, StringComparison.Ordinal);
        Assert.Single(await world.TextsOf());
        await visitor.Presses("Publish version 2");
        Assert.Contains("Version 2 is published and in force", visitor.Text, StringComparison.Ordinal);
        Assert.Equal(Template.Find("acep-2016")!.Text.ReplaceLineEndings("\n"), (await world.TextsOf())[1]);
        using var trainee = await (await world.As(world.Trainee)).Opens($"/standings/{world.Trainee.Id}");
        Assert.Contains("0 of 25", trainee.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Every_fault_is_told_with_its_path_and_the_text_stays()
    {
        var world = await site.NewWorld();
        using var director = await world.WritesTheNextVersion(world.Director);
        await director.Presses(Publishing.Look);
        Assert.Equal(["Give the rulebook as JSON: from a template, from a file, or typed here."], director.Told());
        var text = World.TestRules.Replace("\"version\": 1,", "\"version\": 0, \"colour\": \"red\",", StringComparison.Ordinal).Replace("\"min\": 2", "\"min\": -2", StringComparison.Ordinal);
        await director.Fills(Publishing.Text, text).Presses(Publishing.Look);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, director.Status);
        Assert.Equal(["$.colour: unknown key; expected one of format, name, version, effective, timeZone, notes, sources, counting, introductory, onePerEncounter, applications, groups, overall, items",
            "$.version: expected a whole number, 1 or more (2^53 at most)", "$.applications[1].require[0].min: expected a whole number, 0 or more (2^53 at most)"], director.Told());
        Assert.Equal(text, director.Typed(Publishing.Text).ReplaceLineEndings("\n"));
        Assert.Empty(director.Page.QuerySelectorAll("button[value=publish]"));
        await director.Fills(Publishing.Text, "{ \"format\": ").Presses(Publishing.Look);
        Assert.Equal(["$: expected JSON, but the text breaks off being JSON in line 1"], director.Told());
        await director.Fills(Publishing.Text, $"{{ \"format\": 1, \"applications\": [{string.Join(',', Enumerable.Repeat("1", 500))}] }}").Presses(Publishing.Look);
        Assert.Equal(101, director.Told().Count);
        Assert.EndsWith("more.", director.Told()[^1], StringComparison.Ordinal);
        Assert.Single(await world.TextsOf());
    }

    [Fact]
    public async Task What_the_catalogue_lacks_is_a_warning_and_no_fault()
    {
        var world = await site.NewWorld();
        await world.Behind("paracentesis", (application, by) => application.Retire(by, world.Now));
        using var director = await world.WritesTheNextVersion(world.Director);
        await director.Fills(Publishing.Text, World.TestRules.Replace("\"code\": \"lung\"", "\"code\": \"elbow\"", StringComparison.Ordinal).Replace("\"code\": \"cardiac\"", "\"code\": \"paracentesis\"", StringComparison.Ordinal)).Presses(Publishing.Look);
        Assert.Contains("Nobody can log a scan of elbow until a coordinator adds it", director.Text, StringComparison.Ordinal);
        Assert.Contains("No new scan of Paracentesis can be logged; those there are count.", director.Text, StringComparison.Ordinal);
        await director.Presses("Publish version 2");
        Assert.Equal(HttpStatusCode.OK, director.Status);
        Assert.Equal(2, (await world.TextsOf()).Length);
    }

    [Fact]
    public async Task A_file_is_taken_as_it_is_and_comes_out_the_same()
    {
        var world = await site.NewWorld();
        using var director = await world.WritesTheNextVersion(world.Director);
        var text = World.TestRules.ReplaceLineEndings("\n").Replace("Test rules", "Règles “d’essai” Ж 🫀", StringComparison.Ordinal);
        await director.Fills(Publishing.Text, "typed before").Attaches(Publishing.File, [0xEF, 0xBB, 0xBF, .. Encoding.UTF8.GetBytes(text)]).Presses("Take the file");
        Assert.Equal((HttpStatusCode.OK, text), (director.Status, director.Typed(Publishing.Text).ReplaceLineEndings("\n")));
        await director.Presses("Publish version 2");
        Assert.Contains("published Règles “d’essai” Ж 🫀, version 2", await site.Ask(db => db.LedgerEntries.Where(e => e.Sentence.Contains("version 2") && e.Sentence.Contains(world.Programme.Name)).Select(e => e.Sentence).SingleAsync()), StringComparison.Ordinal);
        Assert.Equal(text, (await world.TextsOf())[1]);
    }

    [Theory]
    [InlineData("utf-16", "This file is written in UTF-16 or is no text. Save it as UTF-8 and send it again.")]
    [InlineData("utf-16BE", "This file is written in UTF-16 or is no text. Save it as UTF-8 and send it again.")]
    [InlineData("iso-8859-1", "This file is not written in UTF-8, perhaps in an older Windows encoding. Save it as UTF-8 and send it again.")]
    [InlineData("none", "Choose a file that is not empty.")]
    public async Task A_file_in_another_encoding_is_named_and_what_was_typed_stays(string encoding, string why)
    {
        var world = await site.NewWorld();
        using var director = await world.WritesTheNextVersion(world.Director);
        if (encoding != "none") director.Attaches(Publishing.File, Encoding.GetEncoding(encoding).GetBytes(World.TestRules.Replace("Test rules", "Règles", StringComparison.Ordinal)));
        await director.Fills(Publishing.Text, "typed before").Presses("Take the file");
        Assert.Equal((HttpStatusCode.UnprocessableEntity, "typed before"), (director.Status, director.Typed(Publishing.Text)));
        Assert.Equal([why], director.Told());
    }

    [Theory]
    [InlineData(true, "This file has 10,485,760 bytes; a rulebook has at most 200,000 characters. Choose another file.")]
    [InlineData(false, "$: expected at most 200,000 characters, found 10,485,760")]
    public async Task Ten_megabytes_of_nested_JSON_are_answered_quickly_in_words(bool asFile, string why)
    {
        var world = await site.NewWorld();
        using var director = await world.WritesTheNextVersion(world.Director);
        var nested = new string('[', 10 * 1024 * 1024);
        if (asFile) director.Attaches(Publishing.File, Encoding.ASCII.GetBytes(nested));
        else director.Fills(Publishing.Text, nested);
        var clock = Stopwatch.StartNew();
        await director.Presses(asFile ? "Take the file" : Publishing.Look);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, director.Status);
        Assert.Equal([why], director.Told());
        Assert.InRange(clock.Elapsed.TotalSeconds, 0, 10); // with reading the page, on a busy machine
    }

    [Fact]
    public async Task A_text_that_was_not_looked_at_is_not_published()
    {
        var world = await site.NewWorld();
        using var director = await world.WritesTheNextVersion(world.Director);
        await director.Fills(Publishing.Text, World.TestRules).Presses(Publishing.Look);
        Assert.Contains("Nothing: it says the same as the version in force.", director.Text, StringComparison.Ordinal);
        await director.Fills(Publishing.Text, Publishing.Stricter).Presses("Publish version 2");
        Assert.Equal(HttpStatusCode.Conflict, director.Status);
        Assert.Contains("This is not the text that was looked at.", director.Text, StringComparison.Ordinal);
        Assert.Contains("Focused cardiac: 5 scans", director.Page.QuerySelectorAll("ins").Select(e => e.TextContent));
        Assert.Single(await world.TextsOf());
        await director.Presses("Publish version 2");
        Assert.Equal(2, (await world.TextsOf()).Length);
    }

    [Theory]
    [InlineData(true)]
    [InlineData(false)]
    public async Task Of_two_who_publish_the_later_sees_what_differs_from_the_new_one(bool atTheWorstMoment)
    {
        var world = await site.NewWorld();
        using var director = await world.WritesTheNextVersion(world.Director);
        await director.Fills(Publishing.Text, Publishing.Stricter).Presses(Publishing.Look);
        Task<int> Rival() => site.Ask(async db =>
        {
            db.Add(Rulebook.Publish(world.Director, world.Programme, "Test rules", 2, World.TestRules.Replace("\"min\": 2", "\"min\": 7", StringComparison.Ordinal), world.Now));
            return await db.SaveChangesAsync();
        });
        if (atTheWorstMoment) site.Rival.ActsBeforeNextSave(Rival);
        else await Rival();
        await director.Presses("Publish version 2");
        Assert.Equal(HttpStatusCode.Conflict, director.Status);
        Assert.Equal(Publishing.Stricter, director.Typed(Publishing.Text).ReplaceLineEndings("\n"));
        Assert.Contains("Lung: 7 scans", director.Page.QuerySelectorAll("del").Select(e => e.TextContent));
        await director.Presses("Publish version 3");
        Assert.Equal((HttpStatusCode.OK, 3), (director.Status, (await world.TextsOf()).Length));
    }

    [Fact]
    public async Task Nobody_else_opens_or_sends_the_form()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        foreach (var person in new[] { world.Trainee, world.Reader, await world.Another("Chi", MembershipKind.Chair), other.Director, await other.Another("Cora", MembershipKind.Coordinator) })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/rulebooks/new?programme={world.Programme.Id}")).Status);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Posts("/rulebooks")).Status);
            if (person.Name.StartsWith('C') || person == other.Director) await Forged(visitor, world, other);
        }
        Assert.Single(await world.TextsOf());
    }

    // The form of one's own programme, sent for another one.
    private static async Task Forged(Visitor visitor, World world, World own)
    {
        if ((await visitor.Opens($"/rulebooks/new?programme={own.Programme.Id}")).Status == HttpStatusCode.NotFound) return;
        await visitor.Fills(Publishing.Text, Publishing.Stricter).Presses(Publishing.Look);
        ((IHtmlInputElement)visitor.Page.QuerySelector("[name='Form.Programme']")!).Value = $"{world.Programme.Id}";
        await visitor.Presses(visitor.Page.QuerySelector<IHtmlButtonElement>("button[value=publish]")!);
        Assert.Equal(HttpStatusCode.NotFound, visitor.Status);
    }
}
