using System.Net.Http.Headers;
using Credtrack.Web.Features.Scans.Pictures;

namespace Credtrack.Web.Tests.Features.Scans.Pictures;

public sealed class TooLongTests(RunningSite site) : IClassFixture<RunningSite>
{
    [Fact]
    public async Task A_form_over_the_limit_is_answered_with_a_page_in_words()
    {
        var world = await site.NewWorld();
        using var trainee = await world.As(world.Trainee);
        using var body = new ByteArrayContent(new byte[Uploads.LongestForm + 1]);
        body.Headers.ContentType = MediaTypeHeaderValue.Parse("multipart/form-data; boundary=x");
        await trainee.Sends("/scans", body);
        Assert.Equal((HttpStatusCode.RequestEntityTooLarge, "This is too much at once"), (trainee.Status, trainee.Page.QuerySelector("h1")!.TextContent));
        Assert.Contains("Go back, leave some pictures out", trainee.Text, StringComparison.Ordinal);
        Assert.Empty(await site.ScansOf(world.Trainee));
    }

    [Fact]
    public async Task A_stranger_is_not_let_in_however_much_they_send()
    {
        using var stranger = site.Visitor();
        using var body = new ByteArrayContent(new byte[1024]);
        body.Headers.ContentType = MediaTypeHeaderValue.Parse("multipart/form-data; boundary=x");
        Assert.StartsWith("/sign-in", (await stranger.Sends("/scans", body)).Url, StringComparison.Ordinal);
    }
}
