using Credtrack.Core.Scans;
using Credtrack.Migrations.Sqlite;
using Credtrack.Web.Features.Scans.Pictures;
using Microsoft.AspNetCore.Hosting;
using Microsoft.Extensions.DependencyInjection;

namespace Credtrack.Web.Tests.Plumbing;

public sealed class StartupTests
{
    [Fact]
    public async Task A_lock_left_by_a_killed_migration_does_not_hold_up_the_next_start()
    {
        var file = BlankSite.NewCopy();
        var options = new DbContextOptionsBuilder<CredtrackDb>();
        SqliteStore.Use(options, $"Data Source={file};Pooling=False");
        await using (var db = new CredtrackDb(options.Options))
            await db.Database.ExecuteSqlAsync($"INSERT INTO __EFMigrationsLock (Id, Timestamp) VALUES (1, '2026-03-01 11:40:00+00:00')");
        using var site = new StartedOn(file); // the clock of the tests says 12:00
        using var stranger = site.Visitor();
        Assert.Equal(HttpStatusCode.OK, (await stranger.Opens("/health/ready")).Status);
    }

    [Fact]
    public async Task A_picture_of_a_form_that_was_never_finished_is_gone_after_a_day()
    {
        var file = BlankSite.NewCopy();
        var (used, abandoned, fresh) = (await Still(11), await Still(12), await Still(13));
        using (var site = new StartedOn(file))
        {
            var world = await site.NewWorld();
            await world.Waiting();
            var files = site.Services.GetRequiredService<PictureFiles>();
            foreach (var still in new[] { abandoned, fresh }) await files.Keep(still);
            var old = site.Clock.Now.UtcDateTime.AddDays(-2);
            foreach (var name in new[] { site.Still.Sha256, abandoned.Sha256 }) File.SetLastWriteTimeUtc(PathOf(name), old);
            File.SetLastWriteTimeUtc(PathOf(fresh.Sha256), site.Clock.Now.UtcDateTime.AddHours(-1));
            used = (await StillImage.From(Stills.Png(90))).Still!;
        }
        using (new StartedOn(file))
        {
            Assert.True(File.Exists(PathOf(used.Sha256)));
            Assert.True(File.Exists(PathOf(fresh.Sha256)));
            Assert.False(File.Exists(PathOf(abandoned.Sha256)));
        }
    }

    [Fact]
    public async Task A_picture_whose_erasure_a_crash_cut_off_is_gone_at_the_next_start()
    {
        var (file, still) = (BlankSite.NewCopy(), await Still(14));
        using (var site = new StartedOn(file))
        {
            var world = await site.NewWorld();
            await site.Services.GetRequiredService<PictureFiles>().Keep(still);
            var scan = await world.With(await world.Waiting(), s => s.Attach(world.Trainee, new StoredStill(still.Sha256, still.Width, still.Height), world.Now));
            await world.With(scan, s => s.TakeOut(world.Reader, s.Pictures.Single(p => p.Number == 2), "A name can be read.", world.Now));
            Assert.True(File.Exists(PathOf(still.Sha256)));
        }
        using (new StartedOn(file)) Assert.False(File.Exists(PathOf(still.Sha256)));
    }

    private static string PathOf(string sha256) => Path.Combine(BlankSite.Folder, "own", sha256[..2], $"{sha256}.jpg");

    private static async Task<StillImage> Still(byte shade) => (await StillImage.From(Stills.Png(shade))).Still!;

    private sealed class StartedOn(string file) : RunningSite(file)
    {
        protected override void ConfigureWebHost(IWebHostBuilder builder)
        {
            base.ConfigureWebHost(builder);
            builder.UseSetting("Pictures:Folder", Path.Combine(BlankSite.Folder, "own"));
        }
    }
}
