using Plant.Physics.Calculators;

namespace Plant.Web.Api;

/// <summary>Stateless calculators.</summary>
public static class CalculatorEndpoints
{
    public static void MapCalculator<TRequest, TResponse>(this IEndpointRouteBuilder routes, string name, Func<TRequest, CalculatorResult<TResponse>> compute)
        where TRequest : class
        where TResponse : class =>
        routes.MapCalculator<TRequest, TResponse>(name, (request, _) => compute(request));

    /// <summary>One whose work can be long enough to be worth stopping when the caller has gone.</summary>
    public static void MapCalculator<TRequest, TResponse>(this IEndpointRouteBuilder routes, string name, Func<TRequest, CancellationToken, CalculatorResult<TResponse>> compute)
        where TRequest : class
        where TResponse : class =>
        routes.MapPost("/" + name, async (HttpRequest http, CancellationToken stop) =>
        {
            var (body, refused) = await Problem.ReadAsync(http, stop);
            if (refused is not null)
            {
                return refused;
            }

            var (request, unbound) = Problem.Bind<TRequest>(body);
            if (unbound is not null)
            {
                return unbound;
            }

            var result = compute(request!, stop);
            return result.Response is { } response ? TypedResults.Json(response, ApiSetup.Json) : Problem.Of(StatusCodes.Status400BadRequest, result.Refusals);
        }).Accepts<TRequest>("application/json").Produces<TResponse>().ProducesProblem(StatusCodes.Status400BadRequest);
}
