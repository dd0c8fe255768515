using Credtrack.Core.Scans;
using Credtrack.Web.Tests.Features.Grants;

namespace Credtrack.Web.Tests.Features.Scans.Withdrawals;

public sealed class WithdrawalsTests(RunningSite site) : IClassFixture<RunningSite>
{
    private const string Button = "Withdraw this scan", Why = "Logged twice: <b>this</b> one is wrong.";

    [Fact]
    public async Task A_withdrawn_scan_is_gone_from_every_day_and_its_page_says_when_and_why()
    {
        var world = await site.NewWorld();
        await world.Read();
        var scan = await world.Read(4, world.Entry(at: world.Now.AddDays(-40)));
        using var trainee = await world.As(world.Trainee);
        Assert.Contains("nearest gap is 1 scan in Focused cardiac", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("2 scans count", (await trainee.Opens("/standings")).Text, StringComparison.Ordinal);
        await Withdraw(trainee, scan);
        Assert.Equal($"/scans/{scan.Id}", trainee.Url);
        Assert.Contains("Withdrawn Sun 1 Mar 2026 by you: it counts on no day.", trainee.Text, StringComparison.Ordinal);
        Assert.Contains(Why, trainee.Text, StringComparison.Ordinal);
        Assert.Contains($"{world.Trainee.Name} withdrew the scan and said why.", trainee.Text, StringComparison.Ordinal);

        Assert.Contains("1 scan counts", (await trainee.Opens("/standings")).Text, StringComparison.Ordinal);
        Assert.DoesNotContain($"{scan.Id}", trainee.Page.DocumentElement.OuterHtml, StringComparison.Ordinal);
        Assert.Contains("0 scans count, 0 wait", (await trainee.Opens($"/standings/{world.Trainee.Id}?asOf=2026-02-10")).Text, StringComparison.Ordinal);
        Assert.Contains("nearest gap is 2 scans in", (await trainee.Opens("/")).Text, StringComparison.Ordinal);
        foreach (var person in new[] { world.Reader, world.Director })
        {
            using var other = await (await world.As(person)).Opens($"/scans/{scan.Id}");
            Assert.Contains($"by {world.Trainee.Name}: it counts on no day.", other.Text, StringComparison.Ordinal);
            Assert.Contains(Why, other.Text, StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task What_waited_leaves_bench_and_home_and_stays_closed_to_who_has_not_read_it()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var reader = await world.As(world.Reader);
        Assert.Contains("1 scan waits for your reading", reader.Text, StringComparison.Ordinal);
        using (var trainee = await world.As(world.Trainee)) await Withdraw(trainee, scan);
        Assert.Contains("Nothing waits for your reading.", (await reader.Opens("/")).Text, StringComparison.Ordinal);
        Assert.Contains("Nothing waits for you", (await reader.Opens("/readings")).Text, StringComparison.Ordinal);
        await reader.Opens($"/scans/{scan.Id}");
        Assert.Contains("Withdrawn Sun 1 Mar 2026: it counts on no day.", reader.Text, StringComparison.Ordinal);
        foreach (var closed in new[] { Why, World.Secret, world.Trainee.Name }) Assert.DoesNotContain(closed, reader.Page.DocumentElement.TextContent, StringComparison.Ordinal);
        Assert.Equal("This scan is withdrawn.", (await reader.Opens($"/scans/{scan.Id}/readings/new")).Page.QuerySelector(".why-not")!.TextContent);
    }

    [Fact]
    public async Task What_a_trainee_logs_next_takes_nothing_from_it()
    {
        var world = await site.NewWorld();
        var kept = await world.Waiting();
        var scan = await world.Withdrawn(await world.Waiting());
        var last = await site.Ask(db => db.LastScanOf(world.Trainee));
        Assert.NotEqual(scan.Id, last!.Id);
        Assert.Equal(kept.Id, last.Id);
        using var trainee = await world.As(world.Trainee);
        await trainee.Opens($"/scans/{scan.Id}/edit");
        Assert.Contains("This scan is withdrawn.", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("1 scan waits for a reading", (await trainee.Opens("/")).Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", "Give the reason.")]
    [InlineData("MRN 00482915 is another patient", "This looks like a number of a person or a record. Take it out: nothing here may identify a patient.")]
    public async Task It_takes_a_reason_that_names_nobody(string reason, string why)
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var trainee = await Form(world, scan);
        await trainee.Fills("Reason", reason).Presses(Button);
        Assert.Equal((HttpStatusCode.UnprocessableEntity, reason), (trainee.Status, trainee.Typed("Reason")));
        Assert.Equal([why], trainee.Faults());
        Assert.Equal(ScanState.Waiting, (await site.Kept(scan.Id))!.State);
    }

    [Fact]
    public async Task What_was_read_meanwhile_is_shown_first_and_the_words_are_kept()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var trainee = await Form(world, scan);
        await world.With(scan, s => s.Read(world.Reader, world.Judgement(), world.Now));
        await trainee.Fills("Reason", Why).Presses(Button);
        Assert.Equal((HttpStatusCode.Conflict, Why), (trainee.Status, trainee.Typed("Reason")));
        Assert.Equal(ScanState.Read, (await site.Kept(scan.Id))!.State);
        await trainee.Presses(Button);
        Assert.Equal(ScanState.Withdrawn, (await site.Kept(scan.Id))!.State);
    }

    [Fact]
    public async Task Twice_is_answered_with_the_reason()
    {
        var world = await site.NewWorld();
        var scan = await world.Waiting();
        using var trainee = await Form(world, scan);
        await world.Withdrawn(scan);
        await trainee.Fills("Reason", Why).Presses(Button);
        Assert.Equal((HttpStatusCode.Conflict, "This scan is withdrawn."), (trainee.Status, trainee.Page.QuerySelector(".why-not")!.TextContent));
        using var drafting = await Form(world, await world.Draft());
        Assert.Equal("This scan is a draft: discard it, there is nothing to withdraw.", drafting.Page.QuerySelector(".why-not")!.TextContent);
    }

    [Fact]
    public async Task Nobody_else_finds_the_form()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        foreach (var person in new[] { world.Reader, world.Director, await world.Another("Tess", MembershipKind.Trainee), await world.Another("Bo", MembershipKind.Trainee, MembershipKind.Director) })
        {
            using var visitor = await world.As(person);
            Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens($"/scans/{scan.Id}/withdrawals/new")).Status);
        }
    }

    [Fact]
    public async Task What_was_signed_keeps_its_evidence_and_both_pages_say_so()
    {
        var world = await site.NewWorld();
        var scan = await world.Read();
        var (grant, _) = await world.Signed();
        var before = await site.Ask(db => db.Grants.AsNoTracking().SingleAsync(g => g.Id == grant));
        using var trainee = await world.As(world.Trainee);
        Assert.DoesNotContain("withdrawn after it was signed", (await trainee.Opens($"/grants/{grant}")).Text, StringComparison.Ordinal);
        await Withdraw(trainee, scan);
        Assert.Contains($"It stood among the evidence when {Granting.Privilege} was signed Sun 1 Mar 2026. What was signed keeps its evidence.", trainee.Text, StringComparison.Ordinal);
        Assert.Contains("1 scan of this evidence was withdrawn after it was signed. What was signed keeps its evidence.", (await trainee.Opens($"/grants/{grant}")).Text, StringComparison.Ordinal);
        var after = await site.Ask(db => db.Grants.AsNoTracking().SingleAsync(g => g.Id == grant));
        Assert.Equal((before.Signature!.Text, before.Signature.Digest, before.State), (after.Signature!.Text, after.Signature.Digest, after.State));
    }

    private static async Task<Visitor> Form(World world, Scan scan) => await (await world.As(world.Trainee)).Opens($"/scans/{scan.Id}/withdrawals/new");

    private static async Task Withdraw(Visitor trainee, Scan scan)
    {
        await trainee.Opens($"/scans/{scan.Id}");
        await trainee.Opens(trainee.Page.QuerySelectorAll("a").Single(a => a.TextContent == "Withdraw it").GetAttribute("href")!);
        await trainee.Fills("Reason", Why).Presses(Button);
    }
}
