using System.Data.Common;
using System.Diagnostics;
using System.Globalization;
using System.Text;

namespace Credtrack.Web.Tests.Features.Imports;

public sealed class ImportsTests : IClassFixture<RunningSite>
{
    private readonly RunningSite site;

    // The shared log runs on for months after the day at which other tests stand still.
    public ImportsTests(RunningSite site)
    {
        this.site = site;
        site.Clock.Now = new SiteClock().Now.AddYears(2);
    }

    [Fact]
    public async Task The_log_of_2400_scans_goes_in_within_seconds_and_again_adds_nothing()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var watch = Stopwatch.StartNew();
        await cora.Imports(Importing.Log);
        Assert.InRange(watch.Elapsed, TimeSpan.Zero, TimeSpan.FromSeconds(30)); // measured: 3 to 5 s for the three pages on two busy cores
        Assert.Contains("2400 scans became evidence", cora.Text, StringComparison.Ordinal);

        // Counted a second time from the file alone.
        var rows = Importing.Log.Split('\n', StringSplitOptions.RemoveEmptyEntries).Skip(1).Select(line => line.TrimEnd('\r').Split(',')).ToList();
        var wanted = rows.GroupBy(r => $"{r[1]} {r[2]}").ToDictionary(g => g.Key, g => (g.Count(), g.Count(r => r[11].Length > 0), g.Count(r => r[9] == "direct"), g.Count(r => r[16].Length > 0)));
        var names = await site.Ask(db => db.People.Where(p => p.Memberships.Any(m => m.ProgrammeId == world.Programme.Id && m.Kind == MembershipKind.Trainee)).ToDictionaryAsync(p => p.Id, p => p.Name));
        var evidence = await site.Ask(db => db.EvidenceOf(names.Keys));
        var found = evidence.SelectMany(p => p.Select(s => (Key: $"{names[p.Key]} {s.Application}", Scan: s))).GroupBy(s => s.Key)
            .ToDictionary(g => g.Key, g => (g.Count(), g.Count(s => s.Scan.Reading is not null), g.Count(s => $"{s.Scan.Supervision}" == "Direct"), g.Count(s => s.Scan.Outcome is not null)));
        Assert.Equal(wanted.OrderBy(w => w.Key, StringComparer.Ordinal), found.OrderBy(f => f.Key, StringComparer.Ordinal));

        await cora.Maps(Importing.Log);
        Assert.Contains("2400 rows are here already and add nothing.", cora.Text, StringComparison.Ordinal);
        Assert.Contains("Nothing of this file would be added.", cora.Text, StringComparison.Ordinal);
        Assert.Equal(2400, await world.Evidence());

        var (few, many) = (await world.As(await world.Another("Cole", MembershipKind.Coordinator)), cora);
        Assert.Equal(10, (await site.Queries.During(() => many.Opens($"/imports/{many.Id()}"))).Count);
        await few.Maps(Importing.Table(world.Row("one", world.Trainee.Name)));
        Assert.Equal(10, (await site.Queries.During(() => few.Opens($"/imports/{few.Id()}"))).Count);
        Assert.Equal(4, (await site.Queries.During(() => few.Opens("/imports"))).Count);
        few.Dispose();
    }

    [Fact]
    public async Task What_is_imported_is_marked_as_read_elsewhere_and_attested()
    {
        var world = await site.NewWorld();
        var importer = await world.Coordinator();
        using var cora = await world.As(importer);
        await cora.Imports(Importing.Table(world.Row("a-1", world.Trainee.Name), world.Row("a-2", World.AddressOf(world.Trainee).ToUpperInvariant(), "lung")));
        Assert.Equal(2, await world.Evidence(world.Trainee));
        var id = await site.Ask(db => db.ImportedRows.Where(r => r.Source == "a-1" && r.ProgrammeId == world.Programme.Id).Select(r => r.ScanId).SingleAsync());
        foreach (var person in new[] { world.Trainee, world.Reader, world.Director })
        {
            using var visitor = await (await world.As(person)).Opens($"/scans/{id}");
            Assert.Contains($"attested by {importer.Name} (the importer): true negative", visitor.Text, StringComparison.Ordinal);
            Assert.Contains("a-1", visitor.Text, StringComparison.Ordinal);
            Assert.Null(visitor.Page.QuerySelector("#answers"));
        }
        using var trainee = await (await world.As(world.Trainee)).Opens($"/standings/{world.Trainee.Id}");
        Assert.Contains($"read elsewhere, attested by {importer.Name}, quality 4 of 5", trainee.Text, StringComparison.Ordinal);
        using var others = await world.As(world.Director);
        Assert.Contains("Count 2", (await others.Opens($"/standings/{world.Trainee.Id}")).Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("performed_at=2026-01-01T10:00+25:00", "Line 2, column “performed_at”: expected a date YYYY-MM-DD or a time YYYY-MM-DDThh:mm[:ss[.fraction]] with Z, +hh:mm, -hh:mm or nothing.")]
    [InlineData("performed_at=2026-06-31", "Line 2, column “performed_at”: expected a date YYYY-MM-DD or a time YYYY-MM-DDThh:mm[:ss[.fraction]] with Z, +hh:mm, -hh:mm or nothing.")]
    [InlineData("performed_at=2199-01-01,read_at=,quality=,views=,result=", "Line 2, column “performed_at”: this time has not come yet.")]
    [InlineData("read_at=", "Line 2, column “quality”: expected read_at beside it.|Line 2, column “views”: expected read_at beside it.|Line 2, column “result”: expected read_at beside it.")]
    [InlineData("read_at=1999-01-01", "Line 2, column “read_at”: expected a day not before that of performed_at.")]
    [InlineData("scan=", "Line 2, column “scan”: expected a value.")]
    public async Task Every_fault_is_named_with_its_line_and_column_and_nothing_is_added(string wrong, string told)
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var cells = world.Row("b-1", world.Trainee.Name).Split(',');
        foreach (var change in wrong.Split(',').Select(c => c.Split('='))) cells[Array.IndexOf(Importing.Header.Split(','), change[0])] = change[1];
        await cora.Maps(Importing.Table(string.Join(',', cells), world.Row("b-2", world.Trainee.Name)));
        Assert.Equal(told.Split('|'), cora.Told());
        Assert.Contains("Nothing is imported while a row is at fault", cora.Text, StringComparison.Ordinal);
        await cora.Posts($"/imports/{cora.Id()}/confirmations");
        Assert.Equal((HttpStatusCode.Conflict, 0), (cora.Status, await world.Evidence()));
    }

    [Fact]
    public async Task Rows_that_occur_twice_short_rows_and_other_headers_are_named_by_the_physical_line()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        var day = $"{world.Now.AddDays(-1):yyyy-MM-dd}";
        await cora.Maps($"performed_at,notes,application,person,scan\r\n{day},\"two\r\nlines\",cardiac,{world.Trainee.Name},c-1\r\n{day},,cardiac,{world.Trainee.Name},c-1\r\n{day},cardiac,{world.Trainee.Name},c-2\r\n");
        Assert.Equal(["Line 4, column “scan”: expected each scan once.", "Line 5: expected 5 cells, found 4."], cora.Told());
        Assert.Contains("Dropped, because no field is chosen for it: “notes”.", cora.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task What_is_no_table_is_refused_at_once_with_the_remedy()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        (byte[] File, string Told)[] files =
        [
            ([], "Choose a CSV file that is not empty."),
            (" \n"u8.ToArray(), "This file is empty. Choose another one."),
            (Stills.Png(shade: 7), "This file is written in UTF-16 or is no text. Save it as UTF-8 and send it again."),
            ([.. "scan,person\nA,J"u8, 0xFC, .. "rgen\n"u8], "This file is not written in UTF-8, perhaps in an older Windows encoding. Save it as UTF-8 and send it again. The first letter in question stands in line 2."),
            ("scan\nA\n"u8.ToArray(), "The first line names fewer than two columns. Save the table as CSV, with the names of its columns in the first line."),
            (Encoding.UTF8.GetBytes(Importing.Header), "This file has a header and no row. Choose another one."),
            (Encoding.UTF8.GetBytes(Importing.Header + string.Concat(Enumerable.Range(1, 300_000).Select(n => string.Create(CultureInfo.InvariantCulture, $"\n{n},p,cardiac,2025-01-01,,,,,,,,,")))), "Line 100002: expected at most 100,000 rows; split the file. Correct the file and send it again."),
            (Encoding.UTF8.GetBytes("scan,person\n\"A,x\nB,y\n" + new string('z', 1_000_001)), "Line 2: expected a record of at most 1000000 characters; is a quote left open. Correct the file and send it again."),
        ];
        foreach (var (file, told) in files)
        {
            await cora.Uploads(file);
            Assert.Equal((HttpStatusCode.UnprocessableEntity, told), (cora.Status, Assert.Single(cora.Told())));
        }
        Assert.Equal(0, await site.Ask(db => db.Imports.CountAsync(i => i.ProgrammeId == world.Programme.Id)));
    }

    [Fact]
    public async Task An_unread_row_is_pending_but_waits_for_its_trainee_before_anybody_reads_it()
    {
        var world = await site.NewWorld();
        using var cora = await world.As(await world.Coordinator());
        await cora.Imports(Importing.Table(world.Row("d-1", world.Trainee.Name, reading: ",,,")));
        var id = await site.Ask(db => db.ImportedRows.Where(r => r.ProgrammeId == world.Programme.Id).Select(r => r.ScanId).SingleAsync());
        using var reader = await (await world.As(world.Reader)).Opens("/readings");
        Assert.DoesNotContain($"{id}", reader.Page.Body!.InnerHtml, StringComparison.Ordinal);
        Assert.Contains("it can be read once its trainee has added pictures and answers", (await reader.Opens($"/scans/{id}")).Text, StringComparison.Ordinal);
        using var trainee = await (await world.As(world.Trainee)).Opens($"/standings/{world.Trainee.Id}");
        Assert.Contains("Pending 1", trainee.Text, StringComparison.Ordinal);
        await trainee.Opens("/scans");
        Assert.StartsWith("1 scan: 1 imported, 0 draft", string.Join(' ', trainee.Page.QuerySelector(".lead")!.TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)), StringComparison.Ordinal);

        await world.With(await site.Ask(db => db.Scans.SingleAsync(s => s.Id == id)), s =>
        {
            s.Attach(world.Trainee, site.Still, world.Now);
            s.Change(world.Trainee, world.Entry(at: s.PerformedAt), [], [], world.Now);
            s.Submit(world.Trainee, world.Now);
        });
        Assert.Equal($"/scans/{id}/readings/new", (await reader.Opens($"/scans/{id}/readings/new")).Url);
        Assert.Equal(HttpStatusCode.OK, reader.Status);
    }

    [Fact]
    public async Task Nobody_imports_scans_of_their_own()
    {
        var world = await site.NewWorld();
        var both = await world.Another("Twain", MembershipKind.Coordinator, MembershipKind.Trainee);
        using var twain = await world.As(both);
        await twain.Uploads(Importing.Table(world.Row("e-1", both.Name)));
        Assert.DoesNotContain($"{both.Id}", twain.Page.Body!.InnerHtml, StringComparison.Ordinal);
        await twain.Fills($"{both.Name} is", "new").Presses(Importing.GoOn);
        Assert.Equal(["Line 2, column “person”: this is you: nobody imports scans of their own. Leave these rows out, or let another coordinator import them."], twain.Told());
        var draft = await world.Draft();
        var fault = await Assert.ThrowsAnyAsync<DbException>(() => site.Ask(async db =>
        {
            var import = Credtrack.Core.Imports.Import.Upload(both, world.Programme, "x.csv", [1], world.Now);
            db.Add(import);
            await db.SaveChangesAsync();
            return await db.Database.ExecuteSqlAsync($"INSERT INTO ImportedRows (ScanId, ImportId, ProgrammeId, TraineeId, AttestedById, Source, Line, Supervision, IsRead) VALUES ({draft.Id}, {import.Id}, {world.Programme.Id}, {both.Id}, {both.Id}, 'x', 2, 'Later', 0)");
        }));
        Assert.Contains("CK_ImportedRows_not_ones_own", fault.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Only_coordinators_of_the_programme_find_an_import()
    {
        var (world, other) = (await site.NewWorld(), await site.NewWorld());
        using var cora = await world.As(await world.Coordinator());
        await cora.Maps(Importing.Table(world.Row("f-1", world.Trainee.Name)));
        var url = $"/imports/{cora.Id()}";
        foreach (var person in new[] { world.Trainee, world.Reader, world.Director, await other.Coordinator() })
        {
            using var visitor = await world.As(person);
            foreach (var page in new[] { url, $"{url}/mappings/new" }) Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens(page)).Status);
            foreach (var verb in new[] { "mappings", "confirmations", "undos", "discards" }) Assert.Equal(HttpStatusCode.NotFound, (await (await visitor.Opens("/")).Posts($"{url}/{verb}")).Status);
            if (!person.Name.StartsWith("Cora", StringComparison.Ordinal)) Assert.Equal(HttpStatusCode.NotFound, (await visitor.Opens("/imports")).Status);
        }
        using var second = await (await world.As(await world.Another("Cole", MembershipKind.Coordinator))).Opens(url);
        Assert.Contains("Only the person who uploaded a file confirms it", second.Text, StringComparison.Ordinal);
    }
}
